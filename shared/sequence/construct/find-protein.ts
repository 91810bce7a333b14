import { baseIndex, type BaseIndex } from '../positions';
import { readBases, wrap, type Strand } from './bases';
import { translate, type GeneticCodeId } from './genetic-code';

export interface ProteinPlace {
  strand: Strand;
  /** Index of the first base of the first codon, from 0, on the strand as given. */
  start: BaseIndex;
}

/**
 * Every place where a construct encodes a protein letter by letter, in all six frames and across the origin of a circle.
 * The first residue is not compared when it is M, since a start codon may be any of the table.
 */
export function findProtein(
  bases: string,
  circular: boolean,
  protein: string,
  table: GeneticCodeId,
): ProteinPlace[] {
  const skipped = protein.startsWith('M') ? 1 : 0;
  const probe = protein.slice(skipped);
  const needed = 3 * protein.length;
  if (probe.length === 0 || needed > bases.length) return [];
  const places: ProteinPlace[] = [];
  const length = circular ? bases.length + needed : bases.length;
  for (const strand of ['+', '-'] as const)
    for (let frame = 0; frame < 3; frame += 1) {
      const sense = readBases(bases, strand === '+' ? 0 : bases.length - 1, length, strand);
      const literal = translate(sense.slice(frame), table);
      for (let at = literal.indexOf(probe, skipped); at >= 0; at = literal.indexOf(probe, at + 1)) {
        const offset = frame + 3 * (at - skipped);
        if (offset >= bases.length) break;
        const start = strand === '+' ? offset : bases.length - 1 - offset;
        places.push({ strand, start: baseIndex(wrap(start, bases.length)) });
      }
    }
  return places;
}
