import { color } from '@/components/theme';
import type { PrimerPicture } from '../primer-picture';
import { columnX, drawing, drawingWidth, endX, letterPlaces } from './drawing-measures';

interface DrawnStrandProps {
  picture: PrimerPicture;
  letters: string;
  y: number;
  ends: readonly [string, string];
}

/** One strand of the template on its sunken ground, changed codons bold. */
export function DrawnStrand({ picture, letters, y, ends }: DrawnStrandProps) {
  const isBold = (column: number) =>
    picture.codons.some(
      (codon) => codon.codonTo !== null && column >= codon.column && column < codon.column + 3,
    );
  const all = Array.from(letters, (_, column) => column);
  const rows = [
    { weight: 400, columns: all.filter((column) => !isBold(column)) },
    { weight: 700, columns: all.filter(isBold) },
  ];
  const baseline = y + 19;
  const endStyle = { fontSize: 12, fill: color.inkSoft } as const;
  return (
    <g>
      <rect
        x={columnX(0)}
        y={y}
        width={endX(0, letters.length) - columnX(0)}
        height={drawing.strandHeight}
        fill={color.sunken}
        fillOpacity={0.75}
      />
      {rows.map(({ weight, columns }) => (
        <text
          key={weight}
          x={letterPlaces(columns)}
          y={baseline}
          textAnchor="middle"
          fontWeight={weight}
          fill={weight === 400 ? color.inkSoft : color.ink}
        >
          {columns.map((column) => letters[column]).join('')}
        </text>
      ))}
      <text x={drawing.margin - 6} y={baseline} textAnchor="end" style={endStyle}>
        {ends[0]}
      </text>
      <text x={drawingWidth(letters.length) - drawing.margin + 6} y={baseline} style={endStyle}>
        {ends[1]}
      </text>
    </g>
  );
}
