import Svg, { Circle, Path } from 'react-native-svg';
import { color, face } from '@/components/theme';

export type StatusName = 'proposed' | 'accepted' | 'contested' | 'retired';

const inks: Record<StatusName, string> = {
  proposed: color.inkSoft,
  accepted: color.good,
  contested: color.warn,
  retired: color.inkSoft,
};

/** Broken ring, check, half ring, struck ring: each with its word. */
export function Status({ status }: { status: StatusName }) {
  const ink = inks[status];
  const line = { stroke: ink, strokeWidth: 1.5, fill: 'none' };
  return (
    <span
      style={{
        display: 'inline-flex',
        alignItems: 'center',
        gap: 5,
        font: `600 12px/16px ${face.text}`,
        whiteSpace: 'nowrap',
        color: ink,
      }}
    >
      <Svg width={16} height={16} viewBox="0 0 16 16" aria-hidden>
        <Circle
          cx={8}
          cy={8}
          r={6.25}
          {...line}
          strokeDasharray={status === 'proposed' ? '2.6 2.3' : undefined}
        />
        {status === 'accepted' ? <Path d="M5.2 8.2l2 2 3.6-4" {...line} /> : null}
        {status === 'contested' ? <Path d="M8 1.75a6.25 6.25 0 0 1 0 12.5z" fill={ink} /> : null}
        {status === 'retired' ? <Path d="M3.6 12.4l8.8-8.8" {...line} /> : null}
      </Svg>
      {status}
    </span>
  );
}
