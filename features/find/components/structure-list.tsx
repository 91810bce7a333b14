import type { Structure } from '@/shared/contracts/structures';
import { counted, List, ListRow, Mark } from '@/components/ui';
import { structurePath } from '@/client/paths';

export function StructureList({
  projectId,
  structures,
}: {
  projectId: string;
  structures: readonly Structure[];
}) {
  return (
    <List label="Structures" rows={structures} keyOf={({ id }) => id}>
      {({ id, name, title, revision, chainCount, waiting }) => (
        <ListRow
          href={structurePath(projectId, id)}
          title={name}
          detail={[`revision ${revision}`, counted(chainCount, 'chain'), title].filter(Boolean).join(', ')}
          end={
            waiting > 0 ? (
              <Mark tone="warn">{`${counted(waiting, 'chain')} to confirm`}</Mark>
            ) : (
              <Mark tone="good">map confirmed</Mark>
            )
          }
        />
      )}
    </List>
  );
}
