import { threads } from '@/shared/contracts/threads';
import { PageTitle, Panes, Screen } from '@/components/layout';
import { useLayout } from '@/components/theme';
import { Empty, NothingHere } from '@/components/ui';
import { useRouteParams } from '@/client/use-route-params';
import { ThreadList } from '../components/thread-list';

/** What is talked about in the project, the latest first; on a wide screen with room for the one that is opened. */
export function ThreadsScreen() {
  const params = useRouteParams(threads.list.params);
  const { hasRail } = useLayout();
  if (!params)
    return (
      <Screen title="Threads">
        <NothingHere />
      </Screen>
    );
  const list = (
    <>
      <PageTitle quietOnPhone detail="the one spoken in last stands first">
        Threads
      </PageTitle>
      <ThreadList projectId={params.projectId} />
    </>
  );
  const items = [{ key: 'numbering', label: 'Numbering', value: 'as each protein prefers' }];
  if (!hasRail)
    return (
      <Screen title="Threads" items={items}>
        {list}
      </Screen>
    );
  return (
    <Screen kind="panes" title="Threads" items={items}>
      <Panes
        name="threads"
        panes={[
          { key: 'list', label: 'Threads', widthPixels: 360, content: list },
          {
            key: 'log',
            label: 'Thread',
            content: <Empty title="No thread is open">Choose one at the left to read and write in it.</Empty>,
          },
        ]}
      />
    </Screen>
  );
}
