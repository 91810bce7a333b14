import type { Thread } from '@/shared/contracts/threads';
import { Plate, plateWords } from '@/components/residue';
import { Banner, Button, counted, Empty, List, ListRow, Loading, Stack, Time } from '@/components/ui';
import { threadPath } from '@/client/paths';
import { lastWords } from '../last-words';
import { useThreads } from '../use-threads';

interface ThreadListProps {
  projectId: string;
  /** The open one, on a wide screen. */
  currentKey?: string;
}

function Row({ projectId, thread, selected }: { projectId: string; thread: Thread; selected: boolean }) {
  const { residue, lastMessage, messageCount } = thread;
  return (
    <ListRow
      href={threadPath(projectId, thread.subject)}
      selected={selected}
      lead={residue ? <Plate size={32} {...plateWords(residue)} /> : undefined}
      title={thread.caption}
      detail={
        <>
          {lastWords(thread)}
          <span style={{ display: 'block', fontSize: 12, lineHeight: '16px', paddingTop: 2 }}>
            {counted(messageCount, 'message')}
            {lastMessage ? ', ' : ''}
            {lastMessage ? <Time iso={lastMessage.at} /> : null}
          </span>
        </>
      }
    />
  );
}

/** All threads of the project, the one spoken in last first. */
export function ThreadList({ projectId, currentKey }: ThreadListProps) {
  const { data, error, hasNextPage, fetchNextPage, isFetchingNextPage, refetch } = useThreads(projectId);
  if (!data && error)
    return (
      <Banner
        kind="danger"
        action={
          <Button kind="quiet" onPress={() => void refetch()}>
            Read again
          </Button>
        }
      >
        The threads could not be read. {error.message}
      </Banner>
    );
  if (!data) return <Loading>Reading the threads</Loading>;
  if (data.length === 0)
    return (
      <Empty title="No thread yet">
        Open a residue, an annotation, a mutant or a structure and write there: its thread then stands in this
        list.
      </Empty>
    );
  return (
    <Stack gap={8}>
      <List label="Threads" rows={data} keyOf={({ id }) => id}>
        {(thread) => (
          <Row projectId={projectId} thread={thread} selected={thread.subjectKey === currentKey} />
        )}
      </List>
      {hasNextPage ? (
        <Button
          kind="quiet"
          onPress={() => void fetchNextPage()}
          busyText={isFetchingNextPage ? 'Reading more threads' : undefined}
        >
          Show older threads
        </Button>
      ) : null}
    </Stack>
  );
}
