import { useState } from 'react';
import type { ChainMap } from '@/shared/contracts/maps';
import type { Family } from '@/shared/contracts/families';
import { FamilyTag, Plate } from '@/components/residue';
import { Button, Caption, countWords, List, ListRow, Mark, Stack } from '@/components/ui';
import { residuePath } from '@/client/paths';
import { useProtein } from '@/features/families';
import { exceptionRuns } from '../exception-runs';
import { preferredLabel } from '../preferred-label';

interface MapExceptionsProps {
  projectId: string;
  chain: ChainMap;
  /** How many chains this holds for. */
  copies: number;
  family: Family | undefined;
}

const shownAtFirst = 20;
const kindWords: Record<ChainMap['exceptions'][number]['kind'], string> = {
  mismatch: 'mismatch',
  engineered: 'made on purpose',
  modified: 'modified',
  undetermined: 'not determined',
  ambiguous: 'ambiguous',
  tag: 'outside the protein',
  insertion: 'insertion',
};

/** Every residue of a chain that is not simply its protein's, with its place and the reason in words. */
export function MapExceptions({ projectId, chain, copies, family }: MapExceptionsProps) {
  const [isWhole, setIsWhole] = useState(false);
  const protein = useProtein(projectId, chain.exceptions.length > 0 ? chain.proteinId : null);
  const { exceptions, proteinId } = chain;
  if (exceptions.length === 0) return null;
  const runs = exceptionRuns(exceptions);
  const rows = isWhole ? runs : runs.slice(0, shownAtFirst);
  const plate = ({ residueIndex, proteinLetter }: ChainMap['exceptions'][number]) => {
    if (!family) return undefined;
    const named =
      protein.data && residueIndex !== null ? preferredLabel(protein.data, residueIndex) : undefined;
    if (!named || proteinLetter === null)
      return <FamilyTag size={22} family={family.name} part={family.part} />;
    return (
      <Plate
        family={family.name}
        part={family.part}
        code={proteinLetter}
        number={named.label}
        numbering={named.numbering}
        organism={chain.organism ?? undefined}
      />
    );
  };
  return (
    <Stack gap={4}>
      <Caption level={3} count={copies > 1 ? `in each of the ${copies} chains` : undefined}>
        {countWords(exceptions.length, 'exception')}
      </Caption>
      <List
        label="Exceptions"
        rows={rows.map((exception, at) => ({ ...exception, key: `${at}` }))}
        keyOf={({ key }) => key}
      >
        {(exception) => (
          <ListRow
            lead={plate(exception)}
            title={`author ${exception.labels}: ${exception.letters}`}
            detail={exception.message}
            end={<Mark>{kindWords[exception.kind]}</Mark>}
            href={
              proteinId !== null && exception.residueIndex !== null
                ? residuePath(projectId, { proteinId, residueIndex: exception.residueIndex })
                : undefined
            }
          />
        )}
      </List>
      {rows.length < runs.length ? (
        <Button onPress={() => setIsWhole(true)}>{`Show all ${runs.length}`}</Button>
      ) : null}
    </Stack>
  );
}
