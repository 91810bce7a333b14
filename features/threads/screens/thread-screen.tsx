import { useRef } from 'react';
import { threads, type Subject } from '@/shared/contracts/threads';
import { Panes, Screen } from '@/components/layout';
import { useLayout } from '@/components/theme';
import { NothingHere, ReadView } from '@/components/ui';
import { threadsPath } from '@/client/paths';
import { useKeys } from '@/client/use-keys';
import { useRouteParams } from '@/client/use-route-params';
import { ThreadHeading } from '../components/thread-heading';
import { ThreadList } from '../components/thread-list';
import { ThreadPanel } from '../components/thread-panel';
import { subjectOfKey } from '../subject-of-key';
import { useThreadOfSubject } from '../use-threads';

/** One thread; on a wide screen beside the list of all. */
export function ThreadScreen() {
  const params = useRouteParams(threads.ofSubject.params);
  const subject = params && subjectOfKey(params.subjectKey);
  if (params && subject) return <OneThread {...params} subject={subject} />;
  return (
    <Screen title="Thread">
      <NothingHere />
    </Screen>
  );
}

interface OneThreadProps {
  projectId: string;
  subjectKey: string;
  subject: Subject;
}

function OneThread({ projectId, subjectKey, subject }: OneThreadProps) {
  const { hasRail } = useLayout();
  const thread = useThreadOfSubject(projectId, subject);
  const frame = useRef<HTMLDivElement>(null);
  useKeys({ r: () => frame.current?.querySelector('textarea')?.focus() });
  const residue = thread.data?.residue;
  const items = [
    ...(residue ? [{ key: 'numbering', label: 'Numbering', value: residue.numbering }] : []),
    { key: 'on', label: 'On', value: thread.data?.caption ?? 'reading' },
    ...(residue ? [{ key: 'organism', label: 'Organism', value: <em>{residue.organism}</em> }] : []),
  ];
  // The thread is known or told missing here; the panel below shows the rest.
  const log = (
    <div
      ref={frame}
      className="frame"
      style={{ display: 'flex', flexDirection: 'column', flex: 1, height: '100%', minHeight: 0 }}
    >
      <ReadView of={thread} what="the thread">
        {(data) => (
          <>
            <ThreadHeading projectId={projectId} subject={subject} thread={data} />
            <div className="frame" style={{ flex: 1, minHeight: 0 }}>
              <ThreadPanel key={subjectKey} projectId={projectId} subject={subject} title={false} />
            </div>
          </>
        )}
      </ReadView>
    </div>
  );
  return (
    <Screen
      kind="panes"
      title={`${thread.data?.caption ?? ''} thread`.trim()}
      backHref={threadsPath(projectId)}
      items={items}
    >
      {hasRail ? (
        <Panes
          name="threads"
          panes={[
            {
              key: 'list',
              label: 'Threads',
              widthPixels: 360,
              content: <ThreadList projectId={projectId} currentKey={subjectKey} />,
            },
            { key: 'log', label: 'Thread', content: log },
          ]}
        />
      ) : (
        <section
          aria-label="Thread"
          data-pane=""
          tabIndex={-1}
          style={{ flex: 1, minHeight: 0, display: 'flex', padding: '12px var(--gutter)' }}
        >
          {log}
        </section>
      )}
    </Screen>
  );
}
