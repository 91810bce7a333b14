import { Caption, KeyValueList, KeyValueRow, Stack } from '@/components/ui';
import type { ConstructTag } from '@/shared/sequence/construct/match-protein';

const endNames = { N: 'Before the protein', C: 'Behind the protein' } as const;

/** Residues a construct adds to the protein, and the tags known among them. */
export function TagWords({ tags }: { tags: readonly ConstructTag[] }) {
  return (
    <Stack gap={4}>
      <Caption
        count={`${tags.reduce((sum, { residues }) => sum + residues.length, 0)}, none of them of the protein`}
      >
        Added residues
      </Caption>
      <KeyValueList label="Added residues">
        {tags.map(({ end, residues, names }) => (
          <KeyValueRow
            key={end}
            name={`${endNames[end]}${names.length > 0 ? `: ${names.join(', ')}` : ''}`}
            value={residues}
            mono
          />
        ))}
      </KeyValueList>
    </Stack>
  );
}
