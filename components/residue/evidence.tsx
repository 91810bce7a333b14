import Svg, { Line, Rect } from 'react-native-svg';
import { color } from '@/components/theme';
import { evidenceWords, type EvidenceEdge, type GradeName } from './residue-words';

const dashes: Record<EvidenceEdge, string | undefined> = {
  observed: undefined,
  equivalence: '5 3',
  predicted: '1.5 3',
};
const inline = {
  display: 'inline-flex',
  alignItems: 'center',
  gap: 6,
  fontSize: 12,
  lineHeight: '16px',
  color: color.inkSoft,
  whiteSpace: 'nowrap',
} as const;

/** A sample of the plate's edge with the word it stands for. */
export function Evidence({ edge }: { edge: EvidenceEdge }) {
  return (
    <span style={inline}>
      <Svg width={20} height={4} aria-hidden>
        <Line
          x1={0}
          y1={2}
          x2={20}
          y2={2}
          stroke={color.inkSoft}
          strokeWidth={edge === 'predicted' ? 3 : 2}
          strokeDasharray={dashes[edge]}
        />
      </Svg>
      {evidenceWords[edge]}
    </span>
  );
}

export const gradeSteps: Record<GradeName, number> = { none: 0, weak: 1, fair: 2, good: 3, strong: 4 };

/** How well an equivalence is supported: four rising bars and the word; no bars for none. */
export function Grade({ grade }: { grade: GradeName }) {
  const filled = gradeSteps[grade];
  return (
    <span style={{ ...inline, color: color.ink, fontSize: 14, lineHeight: '20px' }}>
      {filled > 0 ? (
        <Svg width={22} height={14} aria-hidden>
          {[5, 8, 11, 14].map((height, step) => (
            <Rect
              key={height}
              x={step * 6}
              y={14 - height}
              width={4}
              height={height}
              fill={step < filled ? color.ink : color.lineRule}
            />
          ))}
        </Svg>
      ) : null}
      {grade}
    </span>
  );
}
