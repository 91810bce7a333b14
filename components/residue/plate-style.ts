import type { CSSProperties } from 'react';
import { color, face, partColor, type Part } from '@/components/theme';
import type { EvidenceEdge } from './residue-words';

export type PlateSize = 22 | 32 | 44;

const sizes: Record<PlateSize, { fontSize: number; lineHeight: string; band: number; padding: string }> = {
  22: { fontSize: 14, lineHeight: '20px', band: 5, padding: '0 6px 0 11px' },
  32: { fontSize: 16, lineHeight: '22px', band: 6, padding: '0 9px 0 15px' },
  44: { fontSize: 20, lineHeight: '26px', band: 8, padding: '0 14px 0 20px' },
};

export const edgeStyle: Record<EvidenceEdge, { borderStyle: 'solid' | 'dashed' | 'dotted'; width: number }> =
  {
    observed: { borderStyle: 'solid', width: 1.5 },
    equivalence: { borderStyle: 'dashed', width: 1.5 },
    predicted: { borderStyle: 'dotted', width: 2 },
  };

export function plateFrame(size: PlateSize, evidence: EvidenceEdge, selected: boolean): CSSProperties {
  const edge = edgeStyle[evidence];
  return {
    position: 'relative',
    display: 'inline-flex',
    alignItems: 'center',
    height: size,
    padding: sizes[size].padding,
    borderStyle: edge.borderStyle,
    borderWidth: `${edge.width}px ${edge.width}px ${edge.width}px 0`,
    borderColor: selected ? color.accent : color.lineControl,
    boxShadow: selected ? `0 0 0 1.5px ${color.accent}` : undefined,
    borderRadius: 3,
    background: color.raised,
    color: color.ink,
    fontFamily: face.mono,
    fontSize: sizes[size].fontSize,
    lineHeight: sizes[size].lineHeight,
    fontWeight: 400,
    whiteSpace: 'nowrap',
    textDecoration: 'none',
    verticalAlign: 'baseline',
    margin: '0 1px',
  };
}

export function plateBand(size: PlateSize, part: Part, evidence: EvidenceEdge): CSSProperties {
  const overhang = -edgeStyle[evidence].width;
  return {
    position: 'absolute',
    left: 0,
    top: overhang,
    bottom: overhang,
    width: sizes[size].band,
    background: partColor(part).strong,
    borderRadius: '3px 0 0 3px',
    printColorAdjust: 'exact',
  };
}
