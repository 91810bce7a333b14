import { readBases, wrap } from '../construct/bases';
import type { Coding } from '../construct/coding';
import { codonOfResidue, type ProteinMatch } from '../construct/match-protein';
import type { CheckedMutant, ResidueChange } from '../construct/mutation-check';
import type { ParseResult } from '../parse-result';
import { baseIndex, type BaseIndex } from '../positions';
import { buildPrimingIndex, type PrimingIndex } from './mispriming';

/** A construct made ready for designing: its bases once along the coding strand, and where each 3′ end could bind. */
export interface PrimerConstruct {
  /** Upper case, as given. */
  bases: string;
  circular: boolean;
  coding: Coding;
  /** The whole construct read along the coding strand; index 0 is the first base of that reading. */
  sense: string;
  /** Index of the first coding base in `sense`. */
  codingStart: number;
  priming: PrimingIndex;
}

/** A change with the codon (from 0 in the coding part) that has to be exchanged. */
export interface CodingChange extends ResidueChange {
  codon: number;
}

/** Prepares a construct once for any number of designs. `bases` upper case, `coding` from `readCoding` of the same bases. */
export function preparePrimerConstruct(bases: string, coding: Coding): PrimerConstruct {
  const { strand, circular } = coding;
  const size = bases.length;
  return {
    bases,
    circular,
    coding,
    sense: readBases(bases, strand === '+' ? 0 : size - 1, size, strand),
    codingStart: strand === '+' ? coding.start : size - 1 - coding.start,
    priming: buildPrimingIndex(bases, circular),
  };
}

/** Index on the strand as given of an index in `sense`; indices beyond a circle's end go on at its start. */
export function givenIndex(construct: PrimerConstruct, along: number): BaseIndex {
  const size = construct.bases.length;
  const place = construct.coding.strand === '+' ? along : size - 1 - along;
  return baseIndex(construct.circular ? wrap(place, size) : place);
}

/**
 * Finds the codons of a checked mutant in a construct. Without `match` the encoded protein is the protein itself.
 * Errors: `residue-not-encoded`, `encoded-letter-differs` (the construct carries another residue there already).
 */
export function placeChanges(
  mutant: CheckedMutant,
  coding: Coding,
  match?: ProteinMatch,
): ParseResult<CodingChange[]> {
  const changes: CodingChange[] = [];
  for (const change of mutant.changes) {
    const { residueIndex, label, from, to } = change;
    const codon = match ? codonOfResidue(match, residueIndex) : residueIndex;
    const refuse = (code: string, message: string): ParseResult<CodingChange[]> => ({
      value: null,
      issues: [{ code, severity: 'error', residue: label, message }],
    });
    if (codon === null || codon >= coding.protein.length)
      return refuse('residue-not-encoded', `The construct does not encode residue ${label}.`);
    const encoded = coding.protein.charAt(codon);
    if (encoded !== from)
      return refuse(
        'encoded-letter-differs',
        `At ${label} the construct encodes ${encoded}, not ${from}${encoded === to ? ': the change is there already' : ''}.`,
      );
    changes.push({ ...change, codon });
  }
  return { value: changes, issues: [] };
}
