import { useFieldArray, type Control } from 'react-hook-form';
import Plus from 'lucide-react-native/icons/plus';
import X from 'lucide-react-native/icons/x';
import { evidenceKinds } from '@/shared/contracts/annotations';
import { color } from '@/components/theme';
import { BoundSelect, BoundText } from '@/components/form';
import { Button, IconButton, Text } from '@/components/ui';
import type { AnnotationValues } from '../annotation-values';

const options = evidenceKinds.map((kind) => ({ value: kind, label: kind }));
const most = 10;

/** What supports the statement: a kind and where it is found, a row each. */
export function EvidenceFields({ control }: { control: Control<AnnotationValues> }) {
  const { fields, append, remove } = useFieldArray({ control, name: 'evidence' });
  return (
    <fieldset style={{ display: 'grid', gap: 8 }}>
      <legend style={{ fontWeight: 600, padding: 0 }}>Evidence</legend>
      {fields.length === 0 ? (
        <Text kind="small" tone="soft">
          Nothing named yet. A statement may stand without, but the others will ask.
        </Text>
      ) : null}
      {fields.map((field, place) => (
        <div
          key={field.id}
          style={{
            display: 'grid',
            gridTemplateColumns: 'minmax(0,1fr) auto',
            gap: 8,
            alignItems: 'start',
            padding: '0 0 8px',
            borderBottom: `1px solid ${color.lineHair}`,
          }}
        >
          <BoundSelect
            control={control}
            name={`evidence.${place}.kind`}
            label={`Kind of evidence ${place + 1}`}
            quietLabel
            options={options}
          />
          <IconButton icon={X} label={`Remove evidence ${place + 1}`} onPress={() => remove(place)} />
          <BoundText
            control={control}
            name={`evidence.${place}.reference`}
            label={`Where evidence ${place + 1} is found`}
            quietLabel
            placeholder="model, figure, DOI"
          />
        </div>
      ))}
      {fields.length < most ? (
        <span>
          <Button kind="quiet" icon={Plus} onPress={() => append({ kind: 'coordinates', reference: '' })}>
            Add evidence
          </Button>
        </span>
      ) : null}
    </fieldset>
  );
}
