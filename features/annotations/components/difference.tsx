import { color } from '@/components/theme';
import { diffWords, type DiffPiece } from '../words-diff';

interface DifferenceProps {
  before: string;
  after: string;
  /** Shows only the new side: what was put in is marked, what was taken out is left away. */
  side?: 'new';
}

function Piece({ piece: { kind, text } }: { piece: DiffPiece }) {
  if (kind === 'in')
    return (
      <ins style={{ background: color.goodSoft, textDecorationThickness: 2, textUnderlineOffset: 3 }}>
        {text}
      </ins>
    );
  if (kind === 'out') return <del style={{ background: color.dangerSoft }}>{text}</del>;
  return <>{text}</>;
}

/** A text with what was taken out struck and what was put in underlined. */
export function Difference({ before, after, side }: DifferenceProps) {
  const pieces = diffWords(before, after).filter(({ kind }) => side !== 'new' || kind !== 'out');
  return (
    <p style={{ whiteSpace: 'pre-wrap', overflowWrap: 'anywhere' }}>
      {pieces.map((piece, place) => (
        <Piece key={place} piece={piece} />
      ))}
    </p>
  );
}
