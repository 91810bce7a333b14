import type { CSSProperties, HTMLAttributes } from 'react';
import type { Reading } from '@/shared/contracts/residues';
import { Plate, plateWords, wordsForCode } from '@/components/residue';
import { color, face } from '@/components/theme';
import { countWords, Mark } from '@/components/ui';

const capital = (word: string): string => word.charAt(0).toUpperCase() + word.slice(1);
const frame = (on: boolean): CSSProperties => ({
  display: 'grid',
  gridTemplateColumns: 'minmax(84px, auto) minmax(0,1fr) auto',
  gap: '2px 14px',
  alignItems: 'center',
  minHeight: 56,
  padding: '7px 12px',
  font: `400 14px/20px ${face.text}`,
  cursor: 'pointer',
  background: on ? color.accentSoft : undefined,
  boxShadow: on ? `inset 3px 0 0 ${color.accent}` : undefined,
});

interface ReadingOptionProps {
  reading: Reading;
  /** Why it is a reading, as far as the heading does not say it. */
  why: string;
  highlighted: boolean;
  /** What makes it an option of the list. */
  option: HTMLAttributes<HTMLElement>;
}

/** One thing the text can mean: which residue, why it is a reading, how many pins are there. */
export function ReadingOption({ reading, why, highlighted, option }: ReadingOptionProps) {
  const { residue, mutationTo, mismatch, pinCount } = reading;
  return (
    <div {...option} style={frame(highlighted)}>
      <Plate size={32} {...plateWords(residue)} becomes={mutationTo ?? undefined} />
      <div style={{ minWidth: 0 }}>
        <div>
          <b>{capital(wordsForCode(residue.letter).name)}</b>{' '}
          <span style={{ color: color.inkSoft }}>
            {residue.numbering}, <em>{residue.organism}</em>
          </span>
        </div>
        {why ? <div style={{ color: color.inkSoft }}>{why}</div> : null}
        {mismatch ? <Mark tone="warn">{mismatch}</Mark> : null}
      </div>
      <span style={{ color: color.inkSoft, whiteSpace: 'nowrap' }}>{countWords(pinCount, 'pin')}</span>
    </div>
  );
}
