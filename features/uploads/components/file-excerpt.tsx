import { useEffect, useRef, type CSSProperties } from 'react';
import { color, face } from '@/components/theme';
import { excerptView, type ExcerptLine } from '../excerpt-view';

interface FileExcerptProps {
  excerpt: { firstLine: number; firstColumn: number; lines: readonly string[] };
  place: { line: number; column?: number };
  severity: 'error' | 'warning';
}

const looks = {
  error: { ink: color.danger, ground: color.dangerSoft, on: color.dangerOn },
  warning: { ink: color.warn, ground: color.warnSoft, on: color.warnOn },
};
/** Line numbers stay while the text scrolls. */
const numberStyle: CSSProperties = {
  position: 'sticky',
  left: 0,
  flex: 'none',
  minWidth: '5ch',
  textAlign: 'right',
  padding: '0 1.5ch 0 4px',
  background: color.sunken,
};

/** The text of the file around an issue, with numbered lines and the character in question marked. */
export function FileExcerpt({ excerpt, place, severity }: FileExcerptProps) {
  const lines = excerptView(excerpt, place);
  const frame = useRef<HTMLDivElement>(null);
  useEffect(() => {
    const mark = frame.current?.querySelector('mark');
    // The mark far along a line is brought to the middle of the frame; the page stays where it is.
    if (mark && frame.current) frame.current.scrollLeft = mark.offsetLeft - frame.current.clientWidth / 2;
  }, [excerpt, place.line, place.column]);
  return (
    <div style={{ display: 'grid', gap: 8 }}>
      <div
        ref={frame}
        className="scroll-x"
        role="region"
        aria-label={`The file around line ${place.line}`}
        tabIndex={0}
        style={{ position: 'relative', background: color.sunken, borderRadius: 4, padding: '12px 0' }}
      >
        <ol style={{ width: 'max-content', minWidth: '100%', font: `400 14px/22px ${face.mono}` }}>
          {lines.map((line) => (
            <Line key={line.number} line={line} look={looks[severity]} />
          ))}
        </ol>
      </div>
      {excerpt.firstColumn > 1 ? (
        <p style={{ font: `400 14px/20px ${face.text}`, color: color.inkSoft }}>
          {`The lines are shown from column ${excerpt.firstColumn} on.`}
        </p>
      ) : null}
    </div>
  );
}

function Line({ line, look }: { line: ExcerptLine; look: (typeof looks)[keyof typeof looks] }) {
  const { number, isMarked, before, mark, after } = line;
  return (
    <li aria-current={isMarked ? 'true' : undefined} style={{ display: 'flex', color: color.ink }}>
      <span
        style={{
          ...numberStyle,
          color: isMarked ? look.ink : color.inkSoft,
          fontWeight: isMarked ? 700 : 400,
        }}
      >
        {number}
      </span>
      <span
        style={{
          flex: 1,
          whiteSpace: 'pre',
          paddingRight: 14,
          background: isMarked ? look.ground : undefined,
        }}
      >
        {before}
        {mark ? <mark style={{ background: look.ink, color: look.on, fontWeight: 700 }}>{mark}</mark> : null}
        {after}
        {before || mark || after ? null : '\u00a0'}
      </span>
    </li>
  );
}
