import { useMemo, type ReactNode } from 'react';
import type { Subject } from '@/shared/contracts/threads';
import { Banner, Button, Caption, counted, Empty, Loading, Text } from '@/components/ui';
import { composerPlace } from '@/client/queued-message';
import { useDraft } from '@/client/use-draft';
import { useMay } from '@/features/projects';
import { usePostMessage, useThreadOfSubject } from '../use-threads';
import { Composer } from './composer';
import { ThreadLog } from './thread-log';

export interface ThreadPanelProps {
  projectId: string;
  subject: Subject;
  /** `pane` fills its place and scrolls within; `page` stands at full height; `read` is that without the composer. */
  kind?: 'pane' | 'page' | 'read';
  /** The caption's words; false where a heading stands above already. */
  title?: string | false;
  captionAction?: ReactNode;
}

/** The main thread of a subject: its minutes, what is on its way, and where one writes. */
export function ThreadPanel({
  projectId,
  subject,
  kind = 'pane',
  title = 'Thread',
  captionAction,
}: ThreadPanelProps) {
  const thread = useThreadOfSubject(projectId, subject);
  const { post, takeBack, tryAgain } = usePostMessage(projectId, subject);
  const draft = useDraft(composerPlace({ projectId, subject }));
  const may = useMay(projectId);
  const { data, error, lines } = thread;

  const acts = useMemo(
    () => ({
      tryAgain: (key: string) => void tryAgain(key),
      remove: (key: string) => void takeBack(key),
      rewrite: (key: string) =>
        void takeBack(key).then((message) => {
          if (message) draft.type(draft.text ? `${draft.text}\n\n${message.text}` : message.text);
        }),
    }),
    [tryAgain, takeBack, draft],
  );
  const { hasEarlier, loadEarlier, isLoadingEarlier, earlierError } = thread;
  const earlier = hasEarlier
    ? { load: loadEarlier, isLoading: isLoadingEarlier, error: earlierError?.message ?? null }
    : undefined;
  return (
    <div
      className="frame"
      style={
        kind === 'pane'
          ? { display: 'flex', flexDirection: 'column', height: '100%', minHeight: 0 }
          : undefined
      }
    >
      {title === false ? null : (
        <Caption
          count={data?.thread ? counted(data.thread.messageCount, 'message') : undefined}
          action={captionAction}
        >
          {title}
        </Caption>
      )}
      {error && !data ? (
        <Banner
          kind="danger"
          action={
            <Button kind="quiet" onPress={() => void thread.refetch()}>
              Read again
            </Button>
          }
        >
          The thread could not be read. {error.message}
        </Banner>
      ) : null}
      {thread.isPending ? <Loading>Reading the thread</Loading> : null}
      {data && lines.length === 0 ? (
        <div style={{ flex: 1, paddingTop: 12 }}>
          <Empty title="Nothing said here yet">
            The first message opens the thread; everyone in the project reads it here.
          </Empty>
        </div>
      ) : null}
      {lines.length > 0 ? (
        <ThreadLog
          projectId={projectId}
          lines={lines}
          acts={acts}
          scrolls={kind === 'pane'}
          dayLevel={title === false ? 2 : 3}
          earlier={earlier}
        />
      ) : null}
      {may('comment') && kind !== 'read' ? (
        <Composer
          projectId={projectId}
          subject={subject}
          draft={draft}
          post={post}
          about={data?.caption ?? 'this'}
        />
      ) : null}
      {may('read project') && !may('comment') ? (
        <div style={{ paddingTop: 12 }}>
          <Text kind="small" tone="soft">
            You read here. Writing is for contributors, or for readers too when a lead allows it in the
            settings.
          </Text>
        </div>
      ) : null}
    </div>
  );
}
