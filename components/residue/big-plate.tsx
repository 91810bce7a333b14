import type { CSSProperties, ReactNode } from 'react';
import { color, face, lift, partColor, type Part } from '@/components/theme';
import { Evidence } from './evidence';
import { PartGlyph } from './part-glyph';
import { edgeStyle } from './plate-style';
import { shortLabel, spokenResidue, wordsForCode, type ResidueWords } from './residue-words';

export interface BigPlateProps extends ResidueWords {
  part: Part;
  /** Stands in the place of the amino acid's name, for example the verdict of a read back. */
  verdict?: ReactNode;
  /** Heading level; the residue page's plate is the page's first heading. */
  level?: 1 | 2;
}

const capital = (word: string): string => word.charAt(0).toUpperCase() + word.slice(1);
const band: CSSProperties = {
  display: 'flex',
  flexDirection: 'column',
  alignItems: 'center',
  justifyContent: 'center',
  gap: 8,
  borderRadius: '4px 0 0 4px',
  font: `700 28px/32px ${face.mono}`,
  printColorAdjust: 'exact',
};
const under: CSSProperties = {
  display: 'flex',
  flexWrap: 'wrap',
  alignItems: 'center',
  gap: '0 14px',
  marginTop: 8,
  paddingTop: 7,
  borderTop: `1px solid ${color.lineHair}`,
  color: color.inkSoft,
};

/** The residue at arm's length: its number, name, numbering and organism. */
export function BigPlate({ part, verdict, level = 1, ...residue }: BigPlateProps) {
  const Heading = level === 1 ? 'h1' : 'h2';
  const edge = edgeStyle[residue.evidence ?? 'observed'];
  const words = wordsForCode(residue.code);
  const colors = partColor(part);
  const hasUnder = Boolean(residue.numbering || residue.organism || residue.evidence);
  const border = `${edge.width}px ${edge.borderStyle} ${color.lineControl}`;
  return (
    <div
      className="plate"
      style={{ display: 'grid', gridTemplateColumns: '56px minmax(0,1fr)', minHeight: 96 }}
    >
      <div style={{ ...band, background: colors.strong, color: colors.on }} aria-hidden>
        <span>{residue.family}</span>
        <PartGlyph part={part} stroke={colors.on} />
      </div>
      <div
        style={{
          border,
          borderLeft: 0,
          borderRadius: '0 4px 4px 0',
          background: color.raised,
          boxShadow: lift.low,
          padding: '12px 14px 10px',
          fontSize: 14,
          lineHeight: '20px',
        }}
      >
        <div style={{ display: 'flex', flexWrap: 'wrap', alignItems: 'center', gap: '0 16px' }}>
          <Heading
            aria-label={spokenResidue(residue)}
            style={{ font: `700 40px/44px ${face.mono}`, letterSpacing: -0.5, overflowWrap: 'anywhere' }}
          >
            {shortLabel(residue)}
          </Heading>
          {verdict ?? (
            <div>
              <div style={{ fontSize: 16, fontWeight: 600 }}>{capital(words.name)}</div>
              <div style={{ color: color.inkSoft }}>
                {[words.threeLetter, words.chemistry].filter(Boolean).join(', ')}
              </div>
            </div>
          )}
        </div>
        {hasUnder ? (
          <div style={under}>
            {residue.numbering ? <span>{residue.numbering} numbering</span> : null}
            {residue.organism ? <em>{residue.organism}</em> : null}
            {residue.evidence ? <Evidence edge={residue.evidence} /> : null}
          </div>
        ) : null}
      </div>
    </div>
  );
}
