import type { Design } from '@/shared/contracts/plans';
import { complement, readBases, wrap } from '@/shared/sequence/construct/bases';
import { baseIndex, type BaseIndex } from '@/shared/sequence/positions';
import { codonRows, type CodingConstruct, type CodonRow, type LabelledProtein } from './codon-rows';

/** A codon in the drawing; columns count bases from 0 at the drawing's left end. */
export interface PictureCodon extends CodonRow {
  column: number;
  /** Its new codon, where it is changed. */
  codonTo: string | null;
}

export interface PicturePrimer {
  name: string;
  strand: '+' | '-';
  column: number;
  /** As drawn, left to right: a primer of the reverse strand is drawn from its 3′ end. */
  letters: string;
  /** Whether each letter pairs with the template strand it lies on. */
  pairs: boolean[];
}

/** Primers on their template: both strands, drawn apart, with the primers between. */
export interface PrimerPicture {
  /** First base drawn, from 0. */
  firstBase: BaseIndex;
  lastBase: BaseIndex;
  /** 5′→3′, left to right. */
  top: string;
  /** Its partner, 3′→5′, left to right. */
  bottom: string;
  codons: PictureCodon[];
  primers: PicturePrimer[];
}

/** Bases drawn beyond the primers on each side. */
const flankBases = 9;

/** What to draw of a design; null when the construct is not the one it was designed on. */
export function primerPicture(
  construct: CodingConstruct,
  protein: LabelledProtein | undefined,
  design: Pick<Design, 'primers' | 'codons'>,
): PrimerPicture | null {
  const size = construct.bases.length;
  const [one] = design.primers;
  if (!one || design.primers.some(({ start, length }) => start >= size || length > size)) return null;
  const placed = design.primers.map((primer) => {
    // A primer across the origin of a circle lies near the others, not a whole circle away.
    const ahead = wrap(primer.start - one.start, size);
    return { primer, from: ahead > size / 2 ? ahead - size : ahead };
  });
  const low = Math.min(...placed.map(({ from }) => from)) - flankBases;
  const high = Math.max(...placed.map(({ primer, from }) => from + primer.length)) + flankBases;
  const first = construct.circular ? one.start + low : Math.max(0, one.start + low);
  const end = construct.circular ? one.start + high : Math.min(size, one.start + high);
  const width = Math.min(size, end - first);
  const top = readBases(construct.bases, first, width, '+');
  const bottom = complement(top);
  return {
    firstBase: baseIndex(wrap(first, size)),
    lastBase: baseIndex(wrap(first + width - 1, size)),
    top,
    bottom,
    codons: codonsWithin(construct, protein, design, first, width),
    primers: placed.map(({ primer: { name, strand, bases }, from }) => {
      const column = one.start + from - first;
      const letters = strand === '+' ? bases : [...bases].reverse().join('');
      const carried = strand === '+' ? top : bottom;
      const pairs = Array.from(letters, (letter, step) => letter === carried[column + step]);
      return { name, strand, column, letters, pairs };
    }),
  };
}

function codonsWithin(
  construct: CodingConstruct,
  protein: LabelledProtein | undefined,
  design: Pick<Design, 'codons'>,
  first: number,
  width: number,
): PictureCodon[] {
  const changed = new Map(design.codons.map(({ codonStart, codonTo }) => [codonStart, codonTo]));
  return codonRows(construct, protein)
    .map((row) => ({
      ...row,
      column: wrap(row.base - first, construct.bases.length),
      codonTo: changed.get(row.base) ?? null,
    }))
    .filter(({ column }) => column + 3 <= width)
    .sort((one, other) => one.column - other.column);
}

/** `CAG GCA CTG A`: bases in threes, as they are read aloud. */
export function inTriplets(bases: string): string {
  return bases.replace(/.{3}(?=.)/g, '$& ');
}
