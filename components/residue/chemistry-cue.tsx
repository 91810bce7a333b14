import Svg, { Circle, Path } from 'react-native-svg';
import { color } from '@/components/theme';
import type { ResidueChemistry } from '@/shared/sequence/alphabet';

const strokes: Partial<Record<ResidueChemistry, string>> = {
  acidic: 'M2 4h8',
  basic: 'M2.5 4h7M6 .5v7',
  aliphatic: 'M0 5h12',
  glycine: 'M6 1v6',
  proline: 'M2 6.5l4-4 4 4',
  cysteine: 'M2 2.5h8M2 6h8',
};

/** The second sign of a residue's chemistry, which stays when tints are off or the print is grey. */
export function ChemistryCue({ chemistry }: { chemistry: ResidueChemistry }) {
  return (
    <Svg width={12} height={8} viewBox="0 0 12 8" aria-hidden>
      {chemistry === 'polar' ? <Circle cx={6} cy={4} r={1.6} fill={color.inkSoft} /> : null}
      {chemistry === 'aromatic' ? (
        <Circle cx={6} cy={4} r={2.8} fill="none" stroke={color.inkSoft} strokeWidth={1.5} />
      ) : null}
      {strokes[chemistry] ? (
        <Path d={strokes[chemistry]} stroke={color.inkSoft} strokeWidth={1.5} fill="none" />
      ) : null}
    </Svg>
  );
}
