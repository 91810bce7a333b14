import { color, face } from '@/components/theme';
import type { PictureCodon, PicturePrimer } from '../primer-picture';
import { columnX, drawing, endX, letterPlaces } from './drawing-measures';

interface DrawnPrimerProps {
  primer: PicturePrimer;
  changed: readonly PictureCodon[];
}

/** A primer along the strand it pairs with; its arrow is the 3′ end, from which it is extended. */
export function DrawnPrimer({ primer, changed }: DrawnPrimerProps) {
  const { column, letters, pairs, strand } = primer;
  const runsRight = strand === '+';
  const row = runsRight ? drawing.againstBottom : drawing.againstTop;
  const steps = Array.from(letters, (_, step) => step);
  const isChanged = (step: number) =>
    changed.some((codon) => column + step >= codon.column && column + step < codon.column + 3);
  const columnsOf = (which: readonly number[]) => which.map((step) => column + step);
  const plain = steps.filter((step) => !isChanged(step));
  const inCodon = steps.filter(isChanged);
  const left = columnX(column);
  const right = endX(column, letters.length);
  const arrowY = row.letters - 5;
  return (
    <g>
      <text x={letterPlaces(columnsOf(plain))} y={row.letters} textAnchor="middle" fill={color.ink}>
        {plain.map((step) => letters[step]).join('')}
      </text>
      <text
        x={letterPlaces(columnsOf(inCodon))}
        y={row.letters}
        textAnchor="middle"
        fontWeight={700}
        fill={color.accent}
      >
        {inCodon.map((step) => letters[step]).join('')}
      </text>
      <path
        d={steps
          .filter((step) => pairs[step])
          .map((step) => `M${columnX(column + step) + drawing.cell / 2} ${row.bars}v${drawing.barHeight}`)
          .join('')}
        stroke={color.lineControl}
        strokeWidth={1}
      />
      <path
        d={steps
          .filter((step) => !pairs[step])
          .map((step) => `M${columnX(column + step) + drawing.cell / 2 - 3.5} ${row.bars}l7 7m0 -7l-7 7`)
          .join('')}
        stroke={color.danger}
        strokeWidth={1.75}
      />
      <path
        d={
          runsRight ? `M${right + 2} ${arrowY}h8m-1 -5l8 5l-8 5z` : `M${left - 2} ${arrowY}h-8m1 -5l-8 5l8 5z`
        }
        stroke={color.accent}
        fill={color.accent}
        strokeWidth={1.25}
      />
      <text
        x={runsRight ? left - 6 : right + 6}
        y={row.letters - 1}
        textAnchor={runsRight ? 'end' : 'start'}
        style={{ fontFamily: face.text, fontSize: 12 }}
        fill={color.inkSoft}
      >
        {runsRight ? `forward, ${letters.length} nt, 5′` : `5′, reverse, ${letters.length} nt`}
      </text>
    </g>
  );
}
