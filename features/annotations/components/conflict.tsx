import { useId, useState, type ReactNode } from 'react';
import type { Annotation } from '@/shared/contracts/annotations';
import { TextArea } from '@/components/form';
import { Banner, Button, Card, counted, Row, Stack, Text, Time } from '@/components/ui';
import type { ApiProblem } from '@/client/problem';
import type { AnnotationValues } from '../annotation-values';
import { joinContent } from '../join-content';
import { Difference } from './difference';
import { Refusal } from './refusal';

interface ConflictProps {
  base: Annotation;
  mine: AnnotationValues;
  theirs: Annotation;
  isSaving: boolean;
  problem: ApiProblem | null;
  onSave: (values: AnnotationValues) => void;
  onTakeTheirs: () => void;
}

function Side({ title, children }: { title: ReactNode; children: ReactNode }) {
  const id = useId();
  return (
    <section aria-labelledby={id}>
      <Card sunken>
        <div id={id} style={{ fontWeight: 600, paddingBottom: 4 }}>
          {title}
        </div>
        {children}
      </Card>
    </section>
  );
}

/** What else differs than the text: kind, confidence, evidence. */
const restOf = ({ kind, confidence, evidence }: Pick<AnnotationValues, 'kind' | 'confidence' | 'evidence'>) =>
  `${kind}, confidence ${confidence}, ${evidence.map((one) => `${one.kind} ${one.reference}`.trim()).join('; ') || 'no evidence'}`;

/** Somebody saved while one wrote: both texts with what each changed, and a joined one that can be changed. */
export function Conflict({ base, mine, theirs, isSaving, problem, onSave, onTakeTheirs }: ConflictProps) {
  const joined = joinContent(base, mine, theirs);
  const [text, setText] = useState(joined.values.text);
  const differs = restOf(mine) !== restOf(theirs);
  const busyText = isSaving ? 'Saving' : undefined;
  return (
    <Stack gap={14}>
      <Banner kind="warn">
        <b>
          {theirs.changedBy.name} saved this pin at <Time iso={theirs.changedAt} form="clock" />, while you
          were writing.
        </b>{' '}
        Nothing was overwritten, and your text is kept.
      </Banner>
      <Side title="Yours, not saved">
        <Difference before={base.text} after={mine.text} side="new" />
        {differs ? (
          <Text kind="meta" tone="soft">
            {restOf(mine)}
          </Text>
        ) : null}
      </Side>
      <Side title={`${theirs.changedBy.name}, saved as version ${theirs.versionNumber}`}>
        <Difference before={base.text} after={theirs.text} side="new" />
        {differs ? (
          <Text kind="meta" tone="soft">
            {restOf(theirs)}
          </Text>
        ) : null}
      </Side>
      <TextArea
        label="Joined, can be changed"
        value={text}
        onChange={setText}
        rows={4}
        hint={
          joined.bothChanged === 0
            ? 'The changes stand in different places; both are taken.'
            : `In ${counted(joined.bothChanged, 'place')} both changed the same words: yours stand before theirs. Read it through.`
        }
      />
      <Refusal problem={problem} />
      <Row wrap justify="end">
        <Button onPress={onTakeTheirs}>Take theirs</Button>
        <Button onPress={() => onSave(mine)} busyText={busyText}>
          Keep mine
        </Button>
        <Button
          kind="primary"
          onPress={() => onSave({ ...joined.values, text: text.trim() })}
          busyText={busyText}
        >
          Keep the joined
        </Button>
      </Row>
      <Text kind="meta" tone="soft">
        {`Saved as version ${theirs.versionNumber + 1}; all versions stay in the history.`}
      </Text>
    </Stack>
  );
}
