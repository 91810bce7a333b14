import { projectParams } from '@/shared/contracts/common';
import type { AuditEntry } from '@/shared/contracts/audit';
import { PageTitle, Screen } from '@/components/layout';
import { Button, Empty, List, ListRow, Loading, NothingHere, Stack, Time } from '@/components/ui';
import { settingsPath } from '@/client/paths';
import { placeOfEntry } from '../place-of-entry';
import { useRouteParams } from '@/client/use-route-params';
import { actionWords } from '../action-words.data';
import { useAudit } from '../use-audit';

/** Who did what in a project, newest first. */
export function HistoryScreen() {
  const given = useRouteParams(projectParams);
  return given ? <History projectId={given.projectId} /> : <NothingHere />;
}

function History({ projectId }: { projectId: string }) {
  const { data, hasNextPage, fetchNextPage, isFetchingNextPage } = useAudit(projectId);
  return (
    <Screen title="History" backHref={settingsPath(projectId)} narrow>
      <Stack gap={16}>
        <PageTitle quietOnPhone detail="kept for ever, newest first">
          History
        </PageTitle>
        {data === undefined ? (
          <Loading>Reading what was done</Loading>
        ) : data.length === 0 ? (
          <Empty title="Nothing was done yet">Uploads, maps, pins and plans are written down here.</Empty>
        ) : (
          <List label="What was done" rows={data} keyOf={({ id }) => id}>
            {(entry) => (
              <ListRow
                title={`${entry.by.name} ${actionWords[entry.action] ?? entry.action}`}
                detail={reasonOf(entry)}
                href={placeOfEntry(projectId, entry)}
                end={<Time iso={entry.at} />}
              />
            )}
          </List>
        )}
        {hasNextPage ? (
          <Button busyText={isFetchingNextPage ? 'Reading' : undefined} onPress={() => void fetchNextPage()}>
            Earlier
          </Button>
        ) : null}
      </Stack>
    </Screen>
  );
}

/** What was changed, the words a person gave with it, the name of the file it was about. */
function reasonOf({ after }: AuditEntry): string | undefined {
  if (typeof after !== 'object' || after === null) return undefined;
  const { changes, reason, fileName, name } = after as Record<string, unknown>;
  const words = [changes, reason, fileName, name].filter(
    (one): one is string => typeof one === 'string' && one !== '',
  );
  return words.length > 0 ? words.join(', ') : undefined;
}
