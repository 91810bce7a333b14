import { counted } from '@/components/ui/count-words';
import { color, conservationColor, face } from '@/components/theme';

export interface LetterShare {
  /** One-letter code, or - for a gap. */
  letter: string;
  rowCount: number;
  /** From 0 to 1. */
  share: number;
}

export interface ShareBarsProps {
  shares: readonly LetterShare[];
  /** The letter of the residue shown: its bar is the darkest. */
  own?: string;
  label: string;
}

/** `70 %, 34 rows`. */
export const shareWords = ({ share, rowCount }: LetterShare): string =>
  `${Math.round(share * 100)} %, ${counted(rowCount, 'row')}`;

/** What the rows of the alignment carry in this column: letter, bar, share and count. */
export function ShareBars({ shares, own, label }: ShareBarsProps) {
  return (
    <ul aria-label={label} style={{ display: 'grid', gap: 6, fontSize: 14, lineHeight: '20px' }}>
      {shares.map((entry) => (
        <li
          key={entry.letter}
          style={{ display: 'grid', gridTemplateColumns: '24px 1fr 124px', gap: 10, alignItems: 'center' }}
        >
          <span style={{ fontFamily: face.mono, fontWeight: entry.letter === own ? 700 : 400 }}>
            {entry.letter === '-' ? <span aria-label="gap">–</span> : entry.letter}
          </span>
          <span style={{ height: 14, background: color.sunken, display: 'block' }} aria-hidden>
            <span
              style={{
                display: 'block',
                height: '100%',
                width: `${Math.min(100, Math.max(0, entry.share * 100))}%`,
                background: entry.letter === own ? conservationColor(4) : conservationColor(3),
                printColorAdjust: 'exact',
              }}
            />
          </span>
          <span style={{ fontFamily: face.mono, letterSpacing: -0.3, whiteSpace: 'nowrap' }}>
            {shareWords(entry)}
          </span>
        </li>
      ))}
    </ul>
  );
}
