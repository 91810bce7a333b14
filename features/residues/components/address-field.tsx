import { useState } from 'react';
import X from 'lucide-react-native/icons/x';
import type { ResidueLabel } from '@/shared/contracts/common';
import { TextInput } from '@/components/form';
import { Plate, plateWords } from '@/components/residue';
import { IconButton, List, ListRow, Row, Stack, Text } from '@/components/ui';
import { useLocate } from '../use-residues';

interface AddressFieldProps {
  projectId: string;
  label: string;
  value: ResidueLabel | null;
  onChange: (next: ResidueLabel | null) => void;
}

const plateOf = (residue: ResidueLabel) => <Plate size={32} {...plateWords(residue)} />;

/** A residue named by its address: typed, read by the locator, and taken by hand from what it can mean. */
export function AddressField({ projectId, label, value, onChange }: AddressFieldProps) {
  const [text, setText] = useState('');
  const { data, isBehind, error } = useLocate(projectId, text);
  if (value)
    return (
      <Stack gap={4}>
        <Text kind="small" strong>
          {label}
        </Text>
        <Row gap={8} wrap>
          {plateOf(value)}
          <Text kind="small" tone="soft">
            {value.numbering}, <em>{value.organism}</em>
          </Text>
          <IconButton icon={X} label="Take another residue, or none" onPress={() => onChange(null)} />
        </Row>
      </Stack>
    );
  const found = text.trim() === '' || isBehind ? null : data;
  return (
    <Stack gap={4}>
      <TextInput
        label={label}
        hint="Its address, for example cE59 or K:59; then take what is meant."
        mono
        value={text}
        onChange={setText}
        error={text.trim() !== '' && error ? error.message : undefined}
      />
      {found && found.readings.length === 0 ? (
        <Text kind="small" tone="soft" role="status">
          {found.notReadAs[0] ?? 'No residue of this project reads so.'}
        </Text>
      ) : null}
      {found && found.readings.length > 0 ? (
        <List
          label="What it can mean"
          rows={found.readings}
          keyOf={({ residue, group }) => `${group} ${residue.proteinId} ${residue.residueIndex}`}
        >
          {({ residue, reason, mismatch }) => (
            <ListRow
              lead={plateOf(residue)}
              title={
                <>
                  {residue.numbering}, <em>{residue.organism}</em>
                </>
              }
              detail={mismatch ? `${mismatch}; ${reason}` : reason}
              onPress={() => {
                onChange(residue);
                setText('');
              }}
            />
          )}
        </List>
      ) : null}
    </Stack>
  );
}
