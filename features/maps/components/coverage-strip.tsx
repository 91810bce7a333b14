import type { ChainMap } from '@/shared/contracts/maps';
import { color } from '@/components/theme';
import { stretchWords } from '../map-words';

interface CoverageStripProps {
  segments: ChainMap['segments'];
  /** Null where nothing is proposed: an empty line. */
  proteinLength: number | null;
}

const percent = (part: number, whole: number): string => `${((part / whole) * 100).toFixed(3)}%`;

/** The protein as a line from its first to its last residue; the stretches a chain lies on are thick. */
export function CoverageStrip({ segments, proteinLength }: CoverageStripProps) {
  return (
    <span
      role="img"
      aria-label={`on the protein: ${stretchWords(segments, proteinLength)}`}
      style={{ position: 'relative', display: 'block', minWidth: 80, height: 12 }}
    >
      <span
        style={{ position: 'absolute', insetInline: 0, top: 5.5, height: 1, background: color.lineControl }}
      />
      {proteinLength === null
        ? null
        : segments.map(({ proteinStart, length }) => (
            <span
              key={proteinStart}
              style={{
                position: 'absolute',
                left: percent(proteinStart, proteinLength),
                width: percent(length, proteinLength),
                minWidth: 1,
                top: 2,
                height: 8,
                background: color.inkSoft,
              }}
            />
          ))}
    </span>
  );
}
