import { useId } from 'react';
import ListTree from 'lucide-react-native/icons/list-tree';
import { color, face } from '@/components/theme';
import { Banner, counted, Loading, Mark, Text } from '@/components/ui';
import { groupReadings, reasonsOf, type ReadingGroup } from '../group-readings';
import type { Locator } from '../use-locator';
import { ReadingOption } from './reading-option';

function Spelling({ text }: { text: string }) {
  return (
    <span style={{ font: `400 12px/22px ${face.text}`, color: color.inkSoft, whiteSpace: 'nowrap' }}>
      write{' '}
      <code
        style={{
          padding: '2px 6px',
          border: `1px solid ${color.lineControl}`,
          borderRadius: 3,
          background: color.raised,
          font: `600 12px/16px ${face.mono}`,
        }}
      >
        {text}
      </code>{' '}
      for only this
    </span>
  );
}

function Typed({ children }: { children: string }) {
  return <b style={{ font: `600 14px/20px ${face.mono}` }}>{children}</b>;
}

interface GroupProps {
  group: ReadingGroup;
  /** There is no other reading: no narrower spelling is needed. */
  isAlone: boolean;
  locator: Locator;
  id: string;
}

function Group({ group, isAlone, locator, id }: GroupProps) {
  const { box } = locator;
  const { shared, own } = reasonsOf(group);
  return (
    <div role="group" aria-labelledby={id} style={{ marginTop: 12 }}>
      <div
        id={id}
        role="presentation"
        style={{
          display: 'flex',
          flexWrap: 'wrap',
          justifyContent: 'space-between',
          alignItems: 'center',
          gap: '0 12px',
          padding: '4px 12px',
          font: `600 14px/22px ${face.text}`,
        }}
      >
        <span>
          {group.title}
          {shared ? (
            <span style={{ display: 'block', fontWeight: 400, color: color.inkSoft }}>{shared}</span>
          ) : null}
        </span>
        {isAlone ? null : <Spelling text={group.spelling} />}
      </div>
      {group.readings.map(({ reading, at }, place) => (
        <ReadingOption
          key={at}
          reading={reading}
          why={own[place] ?? ''}
          highlighted={box.highlightedIndex === at}
          option={box.getItemProps({ item: reading, index: at })}
        />
      ))}
    </div>
  );
}

/** What the text can mean, by kind of reading, and what it was not read as. */
export function ReadingList({ locator }: { locator: Locator }) {
  const id = useId();
  const { box, text, found, error, isReading, asksToChoose } = locator;
  const shown = text.trim() !== '' && found !== undefined;
  const count = shown ? found.readings.length : 0;
  return (
    <div style={{ minWidth: 0 }} aria-busy={isReading}>
      {error && text.trim() !== '' ? <Banner kind="danger">{error.message}</Banner> : null}
      {isReading && !shown ? <Loading>{`Reading ${text}`}</Loading> : null}
      <div role="status" style={{ padding: '0 12px', font: `400 14px/22px ${face.text}` }}>
        {text.trim() === '' ? (
          <>
            A family and a number: <Typed>cE59</Typed>, <Typed>βK158</Typed>, <Typed>Glu59</Typed>. A chain
            and its author number: <Typed>K:59</Typed>. A change: <Typed>cE59Q</Typed>. One organism only:{' '}
            <Typed>cE59 @ organism</Typed>.
          </>
        ) : null}
        {shown && count > 0 ? (
          <>
            <Mark tone="warn" icon={ListTree}>
              {`${found.more ? 'the first ' : ''}${counted(count, 'reading')}`}
            </Mark>{' '}
            of <b style={{ font: `600 14px/20px ${face.mono}` }}>{found.text}</b>.{' '}
            {asksToChoose ? <b>Choose one with the arrow keys or a press.</b> : null}
            {!asksToChoose && count > 1 ? 'Choose one; nothing is guessed.' : null}
            {found.more ? ' There are more than are listed: write it more exactly.' : null}
          </>
        ) : null}
        {shown && count === 0 && !isReading ? (
          <>
            No residue of this project reads as <b style={{ fontFamily: face.mono }}>{found.text}</b>. Write a
            family and a number, or a chain and an author number, for example cE59 or K:59.
          </>
        ) : null}
      </div>
      <div {...box.getMenuProps({ 'aria-label': 'Readings' })}>
        {shown
          ? groupReadings(found.readings).map((group, place) => (
              <Group
                key={place}
                id={`${id}-${place}`}
                group={group}
                isAlone={count === 1}
                locator={locator}
              />
            ))
          : null}
      </div>
      {shown && found.notReadAs.length > 0 ? (
        <div
          style={{
            margin: '14px 12px 0',
            paddingTop: 12,
            borderTop: `1px dashed ${color.lineRule}`,
            display: 'grid',
            gap: 2,
          }}
        >
          <Text kind="small" strong>
            Not read as
          </Text>
          {found.notReadAs.map((sentence) => (
            <Text key={sentence} kind="small" tone="soft">
              {sentence.replace(/^Not read as /, '')}
            </Text>
          ))}
        </div>
      ) : null}
    </div>
  );
}
