import Svg, { Path, Rect } from 'react-native-svg';
import { color } from '@/components/theme';

/** The product's sign: a plate with a scale and the index mark. */
export function Logo({ sizePixels = 30 }: { sizePixels?: number }) {
  return (
    <Svg width={sizePixels} height={sizePixels} viewBox="0 0 30 30" aria-hidden>
      <Rect x={2} y={5} width={26} height={20} rx={2.5} fill="none" stroke={color.ink} strokeWidth={2} />
      <Rect x={2} y={5} width={7} height={20} fill={color.accent} />
      <Path d="M14 25v-5M18.5 25v-8M23 25v-5" stroke={color.ink} strokeWidth={2} />
      <Path d="M18.5 13.5l-3.6-5.2h7.2z" fill={color.ink} />
    </Svg>
  );
}
