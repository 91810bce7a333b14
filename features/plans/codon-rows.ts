import type { Protein } from '@/shared/contracts/families';
import type { Construct } from '@/shared/contracts/plans';
import { readBases, wrap } from '@/shared/sequence/construct/bases';
import { baseIndex, residueIndex, type BaseIndex, type ResidueIndex } from '@/shared/sequence/positions';
import { preferredLabelsOf } from './protein-labels';

export type CodingConstruct = Pick<
  Construct,
  'bases' | 'circular' | 'codingStart' | 'codingLength' | 'encoded' | 'segments'
>;
export type LabelledProtein = Pick<Protein, 'residues' | 'numberings' | 'preferredNumbering' | 'length'>;

/** One codon of a construct and the residue it encodes. */
export interface CodonRow {
  /** From 0, counted in the coding part. */
  codon: number;
  /** Its first base, from 0, on the construct as given. */
  base: BaseIndex;
  bases: string;
  /** `*` for the final stop. */
  encoded: string;
  /** Null in a tag, in the stop, or where the construct adds residues. */
  residueIndex: ResidueIndex | null;
  /** In the protein's preferred numbering; null when the residue has no label, or while the protein is not read. */
  label: string | null;
  /** What the protein has there; null outside it. */
  expected: string | null;
}

/** All codons of the coding part, in order. */
export function codonRows(construct: CodingConstruct, protein: LabelledProtein | undefined): CodonRow[] {
  const { bases, codingStart, codingLength, encoded } = construct;
  const labels = protein ? preferredLabelsOf(protein) : [];
  const residues = residuesByCodon(construct);
  return Array.from({ length: Math.floor(codingLength / 3) }, (_, codon) => {
    const base = wrap(codingStart + 3 * codon, bases.length);
    const residue = residues.get(codon) ?? null;
    return {
      codon,
      base: baseIndex(base),
      bases: readBases(bases, base, 3, '+'),
      encoded: encoded[codon] ?? '*',
      residueIndex: residue === null ? null : residueIndex(residue),
      label: residue === null ? null : (labels[residue] ?? null),
      expected: residue === null ? null : (protein?.residues[residue] ?? null),
    };
  });
}

function residuesByCodon({ segments }: CodingConstruct): Map<number, number> {
  const residues = new Map<number, number>();
  for (const { codonStart, proteinStart, length } of segments)
    for (let step = 0; step < length; step += 1) residues.set(codonStart + step, proteinStart + step);
  return residues;
}

/** `229–231`: bases from 1, as they are written; round the circle where need be. */
export function baseRange(first: number, length: number, size: number): string {
  return `${first + 1}–${wrap(first + length - 1, size) + 1}`;
}
