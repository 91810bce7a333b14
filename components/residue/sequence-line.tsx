import type { CSSProperties } from 'react';
import { color, face } from '@/components/theme';
import { Link } from '@/components/ui/link';
import { ChemistryCue } from './chemistry-cue';
import { IndexMark } from './index-mark';
import { wordsForCode } from './residue-words';

export interface SequenceLetter {
  code: string;
  /** Label in the numbering shown. */
  number: string;
  href?: string;
  current?: boolean;
}

export interface SequenceLineProps {
  letters: readonly SequenceLetter[];
  /** What the line is, for a screen reader: "c of Orvella tarda, residues 50 to 68". */
  label: string;
  tints?: boolean;
}

const cell: CSSProperties = {
  position: 'relative',
  flex: 'none',
  display: 'inline-flex',
  flexDirection: 'column',
  alignItems: 'center',
  width: 20,
  height: 34,
  color: color.ink,
  font: `400 16px/24px ${face.mono}`,
  textDecoration: 'none',
};
const slit: CSSProperties = {
  position: 'absolute',
  inset: '-2px -1px',
  border: `1.5px solid ${color.accent}`,
  borderRadius: 3,
  pointerEvents: 'none',
};

function Letter({ letter, tints }: { letter: SequenceLetter; tints: boolean }) {
  const { chemistry, name } = wordsForCode(letter.code);
  const style = { ...cell, background: tints && chemistry ? `var(--chem-${chemistry})` : undefined };
  const content = (
    <>
      <span aria-hidden={letter.href ? true : undefined}>{letter.code}</span>
      {letter.href ? <span className="sr-only">{`${name} ${letter.number}`}</span> : null}
      {chemistry ? <ChemistryCue chemistry={chemistry} /> : null}
      {letter.current ? (
        <>
          <span style={{ position: 'absolute', top: -12, left: 3, lineHeight: 0 }}>
            <IndexMark />
          </span>
          <span style={slit} />
        </>
      ) : null}
    </>
  );
  if (!letter.href) return <span style={style}>{content}</span>;
  return (
    <Link href={letter.href} style={style} current={letter.current ? 'true' : undefined}>
      {content}
    </Link>
  );
}

/** Neighbouring residues in cells; it scrolls sideways within its own frame. */
export function SequenceLine({ letters, label, tints = true }: SequenceLineProps) {
  return (
    <div
      className="scroll-x"
      tabIndex={0}
      role="group"
      aria-label={label}
      style={{ display: 'flex', padding: '14px 2px 6px' }}
    >
      {letters.map((letter, place) => (
        <Letter key={`${place}-${letter.number}`} letter={letter} tints={tints} />
      ))}
    </div>
  );
}
