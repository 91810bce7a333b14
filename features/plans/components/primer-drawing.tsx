import { useEffect, useRef } from 'react';
import { color, face, partColor, type Part } from '@/components/theme';
import type { PrimerPicture } from '../primer-picture';
import { columnX, drawing, drawingWidth, endX } from './drawing-measures';
import { DrawnCodons } from './drawn-codons';
import { DrawnPrimer } from './drawn-primer';
import { DrawnStrand } from './drawn-strand';

interface PrimerDrawingProps {
  picture: PrimerPicture;
  part: Part;
  /** The whole drawing in one sentence. */
  label: string;
}

/** Both strands drawn apart; each primer lies along the strand it pairs with, bars for pairs and crosses for mismatches. */
export function PrimerDrawing({ picture, part, label }: PrimerDrawingProps) {
  const frame = useRef<HTMLDivElement>(null);
  const changed = picture.codons.filter(({ codonTo }) => codonTo !== null);
  const middle = columnX(changed[0]?.column ?? picture.top.length / 2) + 1.5 * drawing.cell;
  useEffect(() => {
    const element = frame.current;
    if (element) element.scrollLeft = middle - element.clientWidth / 2;
  }, [middle]);
  const width = drawingWidth(picture.top.length);
  return (
    <div
      ref={frame}
      className="scroll-x"
      tabIndex={0}
      role="group"
      aria-label="Primer drawing, scrolls sideways"
      style={{ paddingBottom: 4 }}
    >
      <svg
        width={width}
        height={drawing.height}
        viewBox={`0 0 ${width} ${drawing.height}`}
        role="img"
        aria-label={label}
        style={{ display: 'block', fontFamily: face.mono, fontSize: 16 }}
      >
        {changed.map(({ column }) => (
          <rect
            key={column}
            x={columnX(column)}
            y={2}
            width={3 * drawing.cell}
            height={drawing.height - 4}
            rx={3}
            fill={color.accentSoft}
          />
        ))}
        <DrawnStrand picture={picture} letters={picture.top} y={drawing.topStrand} ends={['5′', '3′']} />
        <DrawnStrand
          picture={picture}
          letters={picture.bottom}
          y={drawing.bottomStrand}
          ends={['3′', '5′']}
        />
        <DrawnCodons codons={picture.codons} band={partColor(part).strong} />
        {picture.primers.map((primer) => (
          <DrawnPrimer key={primer.name} primer={primer} changed={changed} />
        ))}
        {changed.map(({ column }) => (
          <rect
            key={column}
            x={columnX(column)}
            y={2}
            width={endX(column, 3) - columnX(column)}
            height={drawing.height - 4}
            rx={3}
            fill="none"
            stroke={color.accent}
            strokeWidth={1.75}
          />
        ))}
      </svg>
    </div>
  );
}
