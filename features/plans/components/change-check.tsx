import { Plate } from '@/components/residue';
import type { Part } from '@/components/theme';
import { Banner, Button, Mark, Row, Stack, Text } from '@/components/ui';
import type { ChangeView } from '../change-view';

interface ChangeCheckProps {
  view: ChangeView;
  residue: { family: string; part: Part; numbering: string; organism: string };
  onTake: (change: string) => void;
}

/** What the protein says to a change while it is typed; what is wrong stands at the field. */
export function ChangeCheck({ view, residue, onTake }: ChangeCheckProps) {
  const warnings = view.issues.filter(({ severity }) => severity === 'warning');
  return (
    <Stack gap={8}>
      {view.changes.length > 0 ? (
        <Row wrap>
          {view.changes.map(({ residueIndex, label, from, to }) => (
            <Plate
              key={residueIndex}
              {...residue}
              code={from}
              number={label}
              becomes={to}
              size={32}
              evidence="observed"
            />
          ))}
          <Mark tone="good">the protein has it there</Mark>
        </Row>
      ) : null}
      {view.unfinished ? (
        <Text tone="soft" role="status">
          {view.unfinished.sentence}
        </Text>
      ) : null}
      {warnings.map(({ message }) => (
        <Banner key={message} kind="warn">
          {message}
        </Banner>
      ))}
      {view.suggestions.length > 0 ? (
        <Row wrap>
          <Text tone="soft">Did you mean</Text>
          {view.suggestions.map((change) => (
            <Button key={change} onPress={() => onTake(change)}>
              {change}
            </Button>
          ))}
        </Row>
      ) : null}
    </Stack>
  );
}
