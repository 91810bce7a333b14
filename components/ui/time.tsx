import type { CSSProperties } from 'react';
import { fullTimeWords, timeWords, type TimeForm } from './time-words';

export interface TimeProps {
  /** ISO 8601, as the server gives it. */
  iso: string;
  /** `clock` 09:12, `day` 30 Nov 2026, `moment` 30 Nov, 09:12. */
  form?: TimeForm;
  style?: CSSProperties;
}

/** A moment in the reader's zone; the title says it in full, with the zone. */
export function Time({ iso, form = 'moment', style }: TimeProps) {
  return (
    <time dateTime={iso} title={fullTimeWords(iso)} style={style}>
      {timeWords(iso, form)}
    </time>
  );
}
