import { useMemo } from 'react';
import ArrowDown from 'lucide-react-native/icons/arrow-down';
import { color, face, layer } from '@/components/theme';
import { Button } from '@/components/ui';
import { usePerson } from '@/client/session';
import { useMembers } from '@/features/projects';
import { byDay, dayWords } from '../minutes';
import type { ThreadLine } from '../thread-lines';
import { useOnline } from '../use-online';
import { useFollowEnd } from '../use-follow-end';
import { useResidueNames } from '../use-residue-names';
import { MessageLine, type LineActs } from './message-line';

export interface ThreadLogProps {
  projectId: string;
  lines: readonly ThreadLine[];
  acts: LineActs;
  /** Scrolls by itself within its place; else it stands at its full height on the page. */
  scrolls: boolean;
  /** Level of the days' headings: one below the heading above. */
  dayLevel: 2 | 3;
  earlier?: { load: () => void; isLoading: boolean; error: string | null };
}

const dayStyle = { padding: '10px 0 2px 52px', font: `400 12px/16px ${face.text}`, color: color.inkSoft };

/** The minutes of a thread, day by day. What arrives never moves what is being read. */
export function ThreadLog({ projectId, lines, acts, scrolls, dayLevel, earlier }: ThreadLogProps) {
  const Day = dayLevel === 2 ? 'h2' : 'h3';
  const ownId = usePerson()?.id;
  const names = useResidueNames(projectId);
  const online = useOnline();
  const { data: members } = useMembers(projectId);
  const days = useMemo(() => byDay(lines), [lines]);
  const { ref, onScroll, unseen, toEnd } = useFollowEnd(lines, ownId);
  const roleOf = (personId: string | undefined) =>
    members?.find((member) => member.personId === personId)?.role;
  return (
    <div style={{ position: 'relative', minHeight: 0, flex: scrolls ? 1 : undefined }} className="frame">
      <div
        ref={ref}
        onScroll={onScroll}
        className="frame"
        tabIndex={scrolls ? 0 : undefined}
        style={
          scrolls
            ? { height: '100%', overflowY: 'auto', scrollbarWidth: 'thin', outlineOffset: -2 }
            : undefined
        }
        role="log"
        aria-label="Messages"
      >
        <div>
          {earlier ? (
            <div style={{ paddingLeft: 52 }}>
              <Button
                kind="quiet"
                onPress={earlier.load}
                busyText={earlier.isLoading ? 'Reading earlier messages' : undefined}
              >
                Earlier messages
              </Button>
              {earlier.error ? <p role="alert">{earlier.error}</p> : null}
            </div>
          ) : null}
          {days.map((day) => (
            <section key={day.key} aria-label={dayWords(day.iso)}>
              <Day style={dayStyle}>{dayWords(day.iso)}</Day>
              {day.lines.map((line) => {
                const writer = line.state === 'stored' ? line.message.by.id : ownId;
                return (
                  <MessageLine
                    key={line.key}
                    line={line}
                    role={roleOf(writer)}
                    own={writer === ownId}
                    online={online}
                    names={names}
                    acts={acts}
                  />
                );
              })}
            </section>
          ))}
        </div>
      </div>
      {unseen > 0 && scrolls ? (
        <div
          className="no-print"
          style={{
            position: 'absolute',
            bottom: 8,
            left: 0,
            right: 0,
            textAlign: 'center',
            zIndex: layer.sticky,
          }}
        >
          <Button icon={ArrowDown} onPress={toEnd}>{`${unseen} new`}</Button>
        </div>
      ) : null}
    </div>
  );
}
