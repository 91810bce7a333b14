import { color, face, type Tone } from '@/components/theme';
import type { IconShape } from './icon';
import { Mark } from './mark';

export interface TallyCell {
  key: string;
  count: number;
  word: string;
  tone?: Tone;
  icon?: IconShape;
}

/** A few counts side by side: the number large, its word with an icon below. */
export function Tally({ cells, label }: { cells: readonly TallyCell[]; label: string }) {
  return (
    <dl
      aria-label={label}
      style={{
        display: 'grid',
        gridTemplateColumns: `repeat(${cells.length}, minmax(0,1fr))`,
        border: `1px solid ${color.lineRule}`,
        borderRadius: 4,
        background: color.raised,
        color: color.ink,
      }}
    >
      {cells.map((cell, place) => (
        <div
          key={cell.key}
          style={{
            display: 'flex',
            flexDirection: 'column-reverse',
            justifyContent: 'flex-end',
            gap: 2,
            padding: '8px 10px 10px',
            borderLeft: place === 0 ? undefined : `1px solid ${color.lineRule}`,
          }}
        >
          <dt>
            <Mark tone={cell.tone} icon={cell.icon}>
              {cell.word}
            </Mark>
          </dt>
          <dd style={{ font: `700 28px/34px ${face.mono}` }}>{cell.count}</dd>
        </div>
      ))}
    </dl>
  );
}
