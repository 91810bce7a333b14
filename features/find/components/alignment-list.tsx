import type { Alignment } from '@/shared/contracts/alignments';
import type { Family } from '@/shared/contracts/families';
import { FamilyTag } from '@/components/residue';
import { List, ListRow, Time } from '@/components/ui';
import { alignmentPath } from '@/client/paths';

interface AlignmentListProps {
  projectId: string;
  alignments: readonly Alignment[];
  families: readonly Family[];
}

export function AlignmentList({ projectId, alignments, families }: AlignmentListProps) {
  return (
    <List label="Alignments" rows={alignments} keyOf={({ id }) => id}>
      {({ id, familyId, name, isReference, revision, rowCount, columnCount, by, at }) => {
        const family = families.find((one) => one.id === familyId);
        return (
          <ListRow
            href={alignmentPath(projectId, id)}
            lead={family ? <FamilyTag family={family.name} part={family.part} /> : undefined}
            title={name}
            detail={
              <>
                {`revision ${revision}${isReference ? ', reference' : ''}; ${by.name}, `}
                <Time iso={at} form="day" />
              </>
            }
            end={`${rowCount} rows, ${columnCount} columns`}
          />
        );
      }}
    </List>
  );
}
