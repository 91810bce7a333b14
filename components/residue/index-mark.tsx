import Svg, { Line, Path } from 'react-native-svg';
import { color } from '@/components/theme';

/** "You are here": the petrol triangle, with a hairline of the given length below it. */
export function IndexMark({
  lineHeightPixels = 0,
  tone = color.accent,
}: {
  lineHeightPixels?: number;
  tone?: string;
}) {
  return (
    <Svg width={14} height={9 + lineHeightPixels} aria-hidden>
      <Path d="M0 0h14l-7 9z" fill={tone} />
      {lineHeightPixels > 0 ? (
        <Line x1={7} y1={8} x2={7} y2={9 + lineHeightPixels} stroke={tone} strokeWidth={1.75} />
      ) : null}
    </Svg>
  );
}
