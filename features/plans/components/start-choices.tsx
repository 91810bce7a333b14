import { Button, Caption, Row, Stack, Text } from '@/components/ui';
import type { StartSuggestion } from '../start-suggestions';

interface StartChoicesProps {
  suggestions: readonly StartSuggestion[];
  codingStart: number;
  proteinName: string;
  onTake: (suggestion: StartSuggestion) => void;
}

function wordsOf({ start, codon, strand, residuesBefore, exact }: StartSuggestion): string {
  const place =
    strand === '-' ? `turn the DNA round, then ${codon} at base ${start}` : `${codon} at base ${start}`;
  const before = residuesBefore > 0 ? `, ${residuesBefore} residues before the protein` : '';
  return `${place}${before}${exact ? '' : ', with differences'}`;
}

/** Starts whose frame encodes the protein, one press each. */
export function StartChoices({ suggestions, codingStart, proteinName, onTake }: StartChoicesProps) {
  const others = suggestions.filter(({ start, strand }) => strand === '-' || start !== codingStart);
  if (others.length === 0) return null;
  return (
    <Stack gap={8}>
      <Caption count={`frames that encode ${proteinName}`}>Start at</Caption>
      <Row wrap>
        {others.map((suggestion) => (
          <Button key={`${suggestion.strand}${suggestion.start}`} onPress={() => onTake(suggestion)}>
            {wordsOf(suggestion)}
          </Button>
        ))}
      </Row>
      <Text kind="meta" tone="soft">
        Bases count from 1, on the strand as it is pasted.
      </Text>
    </Stack>
  );
}
