import type { Family } from '@/shared/contracts/families';
import { FamilyTag, partWords } from '@/components/residue';
import { countWords, List, ListRow } from '@/components/ui';
import { familyPath } from '@/client/paths';

export function FamilyList({ projectId, families }: { projectId: string; families: readonly Family[] }) {
  return (
    <List label="Families" rows={families} keyOf={({ id }) => id}>
      {({ id, name, part, description, proteinCount }) => (
        <ListRow
          href={familyPath(projectId, id)}
          lead={<FamilyTag family={name} part={part} />}
          title={description || partWords[part]}
          detail={description ? partWords[part] : undefined}
          end={countWords(proteinCount, 'protein')}
        />
      )}
    </List>
  );
}
