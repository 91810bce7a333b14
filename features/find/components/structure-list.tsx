import type { Structure } from '@/shared/contracts/structures';
import { List, ListRow, Mark } from '@/components/ui';
import { structurePath } from '@/client/paths';

const chainWords = (count: number): string => `${count} ${count === 1 ? 'chain' : 'chains'}`;

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
          detail={[`revision ${revision}`, chainWords(chainCount), title].filter(Boolean).join(', ')}
          end={
            waiting > 0 ? (
              <Mark tone="warn">{`${chainWords(waiting)} to confirm`}</Mark>
            ) : (
              <Mark tone="good">map confirmed</Mark>
            )
          }
        />
      )}
    </List>
  );
}
