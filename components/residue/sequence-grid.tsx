import { useState, type CSSProperties, type KeyboardEvent } from 'react';
import { color, face, useLayout } from '@/components/theme';
import { Link } from '@/components/ui/link';
import { ChemistryCue } from './chemistry-cue';
import { gridStep, rowLength } from './grid-steps';
import { wordsForCode } from './residue-words';

export interface GridLetter {
  code: string;
  /** Label in the numbering shown; null where the residue has none. */
  number: string | null;
  href: string;
}

export interface SequenceGridProps {
  letters: readonly GridLetter[];
  /** What it is, for a screen reader: "c of Orvella tarda, mature numbering". */
  label: string;
}

const tickHeights = { minor: 3, middle: 5, major: 8 } as const;

/** Only labels that are whole numbers stand on the ruler, and only tens are written. */
function tickOf(number: string | null): { height: number; written: boolean } {
  const value = number !== null && /^-?\d+$/.test(number) ? Number(number) : null;
  if (value === null) return { height: 0, written: false };
  if (value % 10 === 0) return { height: tickHeights.major, written: true };
  return { height: value % 5 === 0 ? tickHeights.middle : tickHeights.minor, written: false };
}

const ruler: CSSProperties = {
  position: 'relative',
  height: 24,
  borderBottom: `1px solid ${color.lineRule}`,
};

function RulerCell({ number }: { number: string | null }) {
  const { height, written } = tickOf(number);
  return (
    <span style={ruler} aria-hidden>
      <span
        style={{
          position: 'absolute',
          left: '50%',
          bottom: 0,
          width: 1,
          height,
          background: color.lineControl,
        }}
      />
      {written ? (
        <span
          style={{
            position: 'absolute',
            left: '50%',
            bottom: 8,
            transform: 'translateX(-50%)',
            font: `400 12px/14px ${face.mono}`,
            color: color.inkSoft,
          }}
        >
          {number}
        </span>
      ) : null}
    </span>
  );
}

interface LetterCellProps {
  letter: GridLetter;
  heightPixels: number;
  isStop: boolean;
}

function LetterCell({ letter, heightPixels, isStop }: LetterCellProps) {
  const { chemistry, name } = wordsForCode(letter.code);
  return (
    <Link
      href={letter.href}
      tabIndex={isStop ? 0 : -1}
      className="row-link"
      style={{
        position: 'relative',
        display: 'grid',
        alignContent: 'center',
        justifyItems: 'center',
        height: heightPixels,
        minWidth: 0,
        color: color.ink,
        font: `400 16px/20px ${face.mono}`,
        textDecoration: 'none',
        background: chemistry ? `var(--chem-${chemistry})` : undefined,
        outlineOffset: -2,
      }}
    >
      <span aria-hidden>{letter.code}</span>
      <span className="sr-only">
        {letter.number === null ? `${name}, no label` : `${name} ${letter.number}`}
      </span>
      {chemistry ? <ChemistryCue chemistry={chemistry} /> : null}
    </Link>
  );
}

/**
 * A whole sequence in rows of ten under a ruler, each letter a link. One stop of the Tab key: arrows walk along and
 * between the rows, Home and End go to their ends.
 */
export function SequenceGrid({ letters, label }: SequenceGridProps) {
  const { name: layout } = useLayout();
  const [stop, setStop] = useState(0);
  const isPhone = layout === 'phone';
  const rows = Array.from({ length: Math.ceil(letters.length / rowLength) }, (_, row) => row * rowLength);
  const linksOf = (field: HTMLElement) => Array.from(field.querySelectorAll<HTMLAnchorElement>('a'));
  const walk = (event: KeyboardEvent<HTMLElement>) => {
    const links = linksOf(event.currentTarget);
    const from = links.findIndex((link) => link === document.activeElement);
    const to = from < 0 ? undefined : gridStep(event.key, from, links.length);
    if (to === undefined || event.altKey || event.ctrlKey || event.metaKey) return;
    event.preventDefault();
    setStop(to);
    links[to]?.focus();
  };
  return (
    <div
      role="group"
      aria-label={label}
      onKeyDown={walk}
      onFocus={(event) => {
        const { target } = event;
        const place = target instanceof HTMLAnchorElement ? linksOf(event.currentTarget).indexOf(target) : -1;
        if (place >= 0) setStop(place);
      }}
      style={{
        display: 'grid',
        gridTemplateColumns: isPhone ? 'minmax(0,1fr)' : 'repeat(auto-fill, 250px)',
        gap: isPhone ? '10px 0' : '14px 22px',
      }}
    >
      {rows.map((start) => (
        <div
          key={start}
          style={{ display: 'grid', gridTemplateColumns: `repeat(${rowLength}, minmax(0,1fr))` }}
        >
          {letters.slice(start, start + rowLength).map((letter, step) => (
            <RulerCell key={`ruler ${start + step}`} number={letter.number} />
          ))}
          {Array.from({ length: Math.max(0, start + rowLength - letters.length) }, (_, step) => (
            <span key={`after ${step}`} />
          ))}
          {letters.slice(start, start + rowLength).map((letter, step) => (
            <LetterCell
              key={start + step}
              letter={letter}
              heightPixels={isPhone ? 44 : 36}
              isStop={start + step === stop}
            />
          ))}
        </div>
      ))}
    </div>
  );
}
