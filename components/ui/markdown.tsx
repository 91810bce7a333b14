import { lazy, Suspense, type ReactElement } from 'react';
import { color, face } from '@/components/theme';
import type { Linkify } from './markdown-parts';

export interface MarkdownProps {
  text: string;
  /**
   * Cuts a text into words and drawn parts, for example residue names into plates. Give a stable function
   * (declared outside or kept by useCallback), or the text is read again at each draw.
   */
  linkify?: Linkify<ReactElement>;
}

// The only place that loads the markdown reader, so that it stays out of the first load.
const MarkdownBody = lazy(() => import('./markdown-body'));

/** Text that people wrote: cleaned, links safe, residue names drawn as plates. */
export function Markdown({ text, linkify }: MarkdownProps) {
  return (
    <div
      className="prose"
      style={{ font: `400 var(--body-size)/var(--body-line) ${face.text}`, color: color.ink }}
    >
      <Suspense fallback={<p style={{ whiteSpace: 'pre-wrap' }}>{text}</p>}>
        <MarkdownBody text={text} linkify={linkify} />
      </Suspense>
    </div>
  );
}
