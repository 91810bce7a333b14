import type { CSSProperties } from 'react';
import Svg, { Circle, Line, Rect } from 'react-native-svg';
import { color, face, partColor, type Part } from '@/components/theme';
import { IndexMark } from './index-mark';
import { placePercent, scaleTicks } from './scale-ticks';

export interface ScaleSpan {
  /** First and last residue, zero-based, both included. */
  from: number;
  to: number;
}

export interface ChainScaleProps {
  part: Part;
  length: number;
  /** Zero-based residue the index mark stands at; left out, no mark. */
  current?: number;
  /** Label of a zero-based residue in the numbering shown. */
  labelAt?: (index: number) => string;
  /** Helices or other stretches, drawn as rounded bars. */
  spans?: readonly ScaleSpan[];
  /** Zero-based residues that carry a pin. */
  pins?: readonly number[];
  /** One sentence beneath; it is also the drawing's name. */
  caption: string;
}

const barTop = 12;
const lineTop = 27;
const tickHeight = { minor: 4, middle: 7, major: 10 } as const;
const percent = (value: number): string => `${value.toFixed(3)}%`;
const number: CSSProperties = {
  position: 'absolute',
  top: 38,
  transform: 'translateX(-50%)',
  font: `400 12px/16px ${face.mono}`,
  color: color.inkSoft,
};

/** A chain as a graduated line: ticks, helices, pinned residues as dots, and the index mark. */
export function ChainScale(props: ChainScaleProps) {
  const { part, length, current, spans = [], pins = [], caption } = props;
  const labelAt = props.labelAt ?? ((index: number) => String(index + 1));
  const place = (index: number): number => placePercent(index, length);
  const ticks = scaleTicks(length, labelAt);
  const colors = partColor(part);
  const here = current === undefined ? undefined : place(current);
  return (
    <figure>
      <div role="img" aria-label={caption} style={{ position: 'relative', height: 54 }}>
        <Svg width="100%" height={40}>
          <Line x1="0" x2="100%" y1={lineTop} y2={lineTop} stroke={color.lineControl} strokeWidth={1} />
          {ticks.map((tick) => (
            <Line
              key={tick.index}
              x1={percent(place(tick.index))}
              x2={percent(place(tick.index))}
              y1={lineTop}
              y2={lineTop + tickHeight[tick.kind]}
              stroke={color.lineControl}
              strokeWidth={1}
            />
          ))}
          {spans.map((span) => (
            <Rect
              key={span.from}
              x={percent((span.from / length) * 100)}
              width={percent(((span.to - span.from + 1) / length) * 100)}
              y={barTop}
              height={10}
              rx={5}
              fill={colors.soft}
              stroke={colors.strong}
              strokeWidth={1.5}
            />
          ))}
          {pins.map((pin) => (
            <Circle key={pin} cx={percent(place(pin))} cy={barTop + 5} r={3.5} fill={color.ink} />
          ))}
        </Svg>
        {ticks.map((tick) =>
          tick.label && (here === undefined || Math.abs(place(tick.index) - here) > 5) ? (
            <span key={tick.index} style={{ ...number, left: percent(place(tick.index)) }}>
              {tick.label}
            </span>
          ) : null,
        )}
        {here !== undefined && current !== undefined ? (
          <span className="slide" style={{ position: 'absolute', top: 4, left: percent(here) }}>
            <span style={{ position: 'absolute', left: -7, lineHeight: 0 }}>
              <IndexMark lineHeightPixels={24} />
            </span>
            <span style={{ ...number, top: 34, color: color.accent, fontWeight: 700 }}>
              {labelAt(current)}
            </span>
          </span>
        ) : null}
      </div>
      <figcaption style={{ fontSize: 12, lineHeight: '16px', color: color.inkSoft }} aria-hidden>
        {caption}
      </figcaption>
    </figure>
  );
}
