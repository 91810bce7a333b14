import { useMemo } from 'react';
import { Caption, List, ListRow, Mark, Stack } from '@/components/ui';
import { findProtein } from '@/shared/sequence/construct/find-protein';
import { isGeneticCodeId } from '@/shared/sequence/construct/genetic-code';
import type { DnaRecord } from '@/shared/sequence/construct/read-dna';

interface RecordChoicesProps {
  records: readonly DnaRecord[];
  /** Residues the construct should encode. */
  protein: string | undefined;
  geneticCode: number;
  onTake: (record: DnaRecord) => void;
}

const recordsShown = 20;

/** A file of several records: the one that is the construct, those that encode the protein first. */
export function RecordChoices({ records, protein, geneticCode, onTake }: RecordChoicesProps) {
  const rows = useMemo(() => {
    const table = isGeneticCodeId(geneticCode) ? geneticCode : 1;
    return records
      .map((record, place) => ({
        record,
        place,
        encodes: protein !== undefined && findProtein(record.bases, false, protein, table).length > 0,
      }))
      .sort((one, other) => Number(other.encodes) - Number(one.encodes) || one.place - other.place)
      .slice(0, recordsShown);
  }, [records, protein, geneticCode]);
  return (
    <Stack gap={4}>
      <Caption count={`${records.length} in the text, one is a construct`}>Which record</Caption>
      <List label="Records of the pasted text" rows={rows} keyOf={({ place }) => String(place)}>
        {({ record, encodes }) => (
          <ListRow
            title={record.name || 'without a name'}
            detail={[record.description, `${record.bases.length} bases, line ${record.line}`]
              .filter(Boolean)
              .join(', ')}
            end={encodes ? <Mark tone="good">encodes the protein</Mark> : undefined}
            onPress={() => onTake(record)}
          />
        )}
      </List>
    </Stack>
  );
}
