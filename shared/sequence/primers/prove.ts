import { readBases, wrap, type Strand } from '../construct/bases';
import { translate, type GeneticCodeId } from '../construct/genetic-code';
import { baseIndex, residueIndex } from '../positions';
import { buildPairProduct } from './pair-product';
import type { ProofDifference } from './types';

/** What the product is held against. Indices from 0, on the strand of the construct as given. */
export interface ProofTask {
  bases: string;
  circular: boolean;
  coding: { start: number; length: number; strand: Strand; table: GeneticCodeId };
  /** The exchanges that were asked, by codon from 0 in the coding part. */
  asked: readonly { codon: number; to: string }[];
}

export interface Proof {
  proved: boolean;
  /** Whole DNA after the change, from the construct's first base on; empty when none could be built. */
  product: string;
  /** Read back from it, without the final stop. */
  encodes: string;
  differences: ProofDifference[];
}

function compare(task: ProofTask, product: string): { encodes: string; differences: ProofDifference[] } {
  const { bases, coding, asked } = task;
  const differences: ProofDifference[] = [];
  if (product.length !== bases.length)
    return {
      encodes: '',
      differences: [
        {
          code: 'length-changed',
          message: `The product has ${product.length} bases, the construct ${bases.length}; the frame is lost.`,
        },
      ],
    };
  const wanted = new Map(asked.map(({ codon, to }) => [codon, to]));
  const read = (dna: string) =>
    translate(readBases(dna, coding.start, coding.length, coding.strand), coding.table);
  const before = read(bases);
  const after = read(product);
  for (let codon = 0; codon < before.length; codon += 1) {
    const expected = wanted.get(codon) ?? before.charAt(codon);
    const found = after.charAt(codon);
    if (found === expected) continue;
    const code = wanted.has(codon)
      ? 'change-missing'
      : found === '*' || expected === '*'
        ? 'stop-changed'
        : 'other-residue-changed';
    differences.push({
      code,
      residueIndex: residueIndex(codon),
      message: `Codon ${codon + 1} reads ${found} where ${expected} is wanted.`,
    });
  }
  for (const codon of wanted.keys())
    if (codon < 0 || codon >= before.length)
      differences.push({
        code: 'change-missing',
        message: `Codon ${codon + 1} lies outside the coding part.`,
      });
  const free = new Set(
    [...wanted.keys()].flatMap((codon) =>
      [0, 1, 2].map((step) => {
        const along = 3 * codon + step;
        return wrap(coding.strand === '+' ? coding.start + along : coding.start - along, bases.length);
      }),
    ),
  );
  for (let index = 0; index < bases.length; index += 1)
    if (bases[index] !== product[index] && !free.has(index))
      differences.push({
        code: 'other-base-changed',
        baseIndex: baseIndex(index),
        message: `Base ${index + 1} becomes ${product[index]}, outside the codons that were asked for.`,
      });
  return { encodes: after.replace(/\*$/, ''), differences };
}

/**
 * Reads a design back: builds the product from the primer strings (`first` in one direction, `second` its complement), translates it
 * and compares it with the exchanges that were asked: those and no other, in frame, every other base unchanged.
 */
export function provePair(task: ProofTask, first: string, second: string): Proof {
  const built = buildPairProduct(task.bases, task.circular, first, second);
  if ('difference' in built)
    return { proved: false, product: '', encodes: '', differences: [built.difference] };
  const { encodes, differences } = compare(task, built.product);
  return { proved: differences.length === 0, product: built.product, encodes, differences };
}
