import { FamilyTag } from '@/components/residue';
import type { Part } from '@/components/theme';
import { List, ListRow } from '@/components/ui';
import { constructPath } from '@/client/paths';
import type { Construct } from '@/shared/contracts/plans';

interface ConstructListProps {
  projectId: string;
  constructs: readonly Construct[];
  /** Undefined until the families are read: no colour is better than a wrong one. */
  partOf: (familyId: string) => Part | undefined;
}

function Tag({ family, part }: { family: string; part: Part | undefined }) {
  return part ? <FamilyTag family={family} part={part} /> : <span style={{ width: 36 }}>{family}</span>;
}

/** The lab's DNA: what it encodes, how long it is. */
export function ConstructList({ projectId, constructs, partOf }: ConstructListProps) {
  return (
    <List label="Constructs" rows={constructs} keyOf={({ id }) => id}>
      {(construct) => (
        <ListRow
          lead={<Tag family={construct.family} part={partOf(construct.familyId)} />}
          title={construct.name}
          detail={
            <>
              <em>{construct.organism}</em>
              {`, ${construct.bases.length} bases, ${construct.circular ? 'circular' : 'linear'}`}
            </>
          }
          end={construct.issues.length > 0 ? `${construct.issues.length} to look at` : undefined}
          href={constructPath(projectId, construct.id)}
        />
      )}
    </List>
  );
}
