import type { CSSProperties, ReactElement } from 'react';
import CircleX from 'lucide-react-native/icons/circle-x';
import Send from 'lucide-react-native/icons/send';
import WifiOff from 'lucide-react-native/icons/wifi-off';
import { color, face } from '@/components/theme';
import { Button, Mark, Markdown, Row, Time, type Linkify } from '@/components/ui';
import { momentOf } from '../minutes';
import type { ThreadLine } from '../thread-lines';

export interface LineActs {
  tryAgain: (clientKey: string) => void;
  /** Back into the composer, to be written anew. */
  rewrite: (clientKey: string) => void;
  remove: (clientKey: string) => void;
}

interface MessageLineProps {
  line: ThreadLine;
  role?: string;
  own: boolean;
  /** The line to the server is up. */
  online: boolean;
  names: Linkify<ReactElement>;
  acts: LineActs;
}

const frame: CSSProperties = {
  display: 'grid',
  gridTemplateColumns: '44px minmax(0,1fr)',
  gap: 8,
  padding: '8px 0',
  font: `400 var(--body-size)/var(--body-line) ${face.text}`,
};

/** One entry of the minutes: time in the margin, a rule, who and as what, and what was said. */
export function MessageLine({ line, role, own, online, names, acts }: MessageLineProps) {
  const isStored = line.state === 'stored';
  const text = isStored ? line.message.text : line.queued.text;
  const name = isStored && !own ? line.message.by.name : 'You';
  return (
    <article style={frame} aria-label={`${name}${role ? `, ${role}` : ''}`}>
      <Time
        iso={momentOf(line)}
        form="clock"
        style={{ font: `400 14px/var(--body-line) ${face.mono}`, color: color.inkSoft }}
      />
      <div
        style={{
          borderLeft: `1.5px ${isStored ? 'solid' : 'dashed'} ${isStored ? color.lineRule : color.lineControl}`,
          paddingLeft: 14,
          minWidth: 0,
        }}
      >
        <p>
          <b>{name}</b> {role ? <span style={{ color: color.inkSoft }}>{role}</span> : null}
        </p>
        <Markdown text={text} linkify={names} />
        {line.state === 'waiting' ? (
          <p style={{ paddingTop: 4 }}>
            <Mark tone={online ? 'soft' : 'warn'} icon={online ? Send : WifiOff}>
              {online ? 'on its way' : 'waiting, sent once you are online'}
            </Mark>
          </p>
        ) : null}
        {line.state === 'refused' ? <Refused line={line} acts={acts} /> : null}
      </div>
    </article>
  );
}

function Refused({ line, acts }: { line: ThreadLine & { state: 'refused' }; acts: LineActs }) {
  return (
    <div style={{ paddingTop: 4 }}>
      <Mark tone="danger" icon={CircleX}>{`not taken: ${line.refusal}`}</Mark>
      <Row gap={4} wrap>
        <Button kind="quiet" onPress={() => acts.tryAgain(line.key)}>
          Send again
        </Button>
        <Button kind="quiet" onPress={() => acts.rewrite(line.key)}>
          Write anew
        </Button>
        <Button kind="quiet" onPress={() => acts.remove(line.key)}>
          Remove
        </Button>
      </Row>
    </div>
  );
}
