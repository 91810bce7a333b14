import Svg, { Circle, Path, Rect } from 'react-native-svg';
import { partColor, type Part } from '@/components/theme';

export const partWords: Record<Part, string> = {
  rotor: 'rotor',
  stator: 'stator',
  head: 'catalytic head',
  stalk: 'peripheral stalk',
  other: 'other',
};

export interface PartGlyphProps {
  part: Part;
  sizePixels?: number;
  /** Left out, the part's own colour. */
  stroke?: string;
}

/** The sign of a part, drawn beside its word or letter, never as the only sign. */
export function PartGlyph({ part, sizePixels = 18, stroke = partColor(part).strong }: PartGlyphProps) {
  const line = { stroke, strokeWidth: 1.75, fill: 'none' };
  return (
    <Svg width={sizePixels} height={sizePixels} viewBox="0 0 24 24" aria-hidden>
      {part === 'rotor' ? <Circle cx={12} cy={12} r={9} {...line} /> : null}
      {part === 'rotor' ? <Circle cx={12} cy={12} r={3} fill={stroke} /> : null}
      {part === 'stator' ? <Path d="M4 4h16v16h-16zM4 12h16" {...line} /> : null}
      {part === 'head' ? <Path d="M12 3l8 4.5v9l-8 4.5-8-4.5v-9z" {...line} /> : null}
      {part === 'stalk' ? <Path d="M8 3v18M16 3v18" {...line} strokeWidth={2.25} /> : null}
      {part === 'other' ? (
        <Rect x={6} y={6} width={12} height={12} {...line} transform="rotate(45 12 12)" />
      ) : null}
    </Svg>
  );
}
