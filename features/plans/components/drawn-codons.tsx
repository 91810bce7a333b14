import { color } from '@/components/theme';
import type { PictureCodon } from '../primer-picture';
import { columnX, drawing } from './drawing-measures';

/** Residues over their codons, with their labels and the codons' borders. */
export function DrawnCodons({ codons, band }: { codons: readonly PictureCodon[]; band: string }) {
  return (
    <g>
      {codons.map(({ column, encoded, label, codonTo }) => {
        const x = columnX(column);
        const middle = x + 1.5 * drawing.cell;
        const isChanged = codonTo !== null;
        return (
          <g key={column}>
            {isChanged ? (
              <>
                <rect x={x} y={2} width={3 * drawing.cell} height={34} rx={3} fill={color.raised} />
                <rect x={x} y={2} width={5} height={34} fill={band} />
              </>
            ) : null}
            <text
              x={middle}
              y={19}
              textAnchor="middle"
              fontWeight={700}
              fill={label === null ? color.inkSoft : color.ink}
            >
              {encoded}
            </text>
            <text
              x={middle}
              y={32}
              textAnchor="middle"
              style={{ fontSize: 12, fontWeight: isChanged ? 700 : 400 }}
              fill={isChanged ? color.ink : color.inkSoft}
            >
              {label ?? ''}
            </text>
            <path
              d={`M${x} 42v10M${x} ${drawing.bottomStrand + drawing.strandHeight}v5`}
              stroke={color.lineRule}
              strokeWidth={1}
            />
          </g>
        );
      })}
    </g>
  );
}
