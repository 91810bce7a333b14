import type { Protein } from '@/shared/contracts/families';
import { readBases, wrap } from '@/shared/sequence/construct/bases';
import { readCoding } from '@/shared/sequence/construct/coding';
import {
  isGeneticCodeId,
  isStartCodon,
  translateCodon,
  type GeneticCodeId,
} from '@/shared/sequence/construct/genetic-code';
import { matchProtein, type ProteinMatch } from '@/shared/sequence/construct/match-protein';
import { readDnaRecords, type DnaRecord } from '@/shared/sequence/construct/read-dna';
import { labelOfResidue } from '@/shared/sequence/numbering/numbering';
import type { Issue } from '@/shared/sequence/parse-result';
import { preferredNumberingOf } from './protein-labels';
import { suggestStarts, type StartSuggestion } from './start-suggestions';

/** A construct as far as it is filled in. */
export interface CodingInput {
  dna: string;
  /** From 1; null while it is no number. */
  codingStart: number | null;
  circular: boolean;
  geneticCode: number;
}

/** What the DNA says so far; the server reads it the same way. */
export interface CodingView {
  records: readonly DnaRecord[];
  /** The one record, when there is just one. */
  bases: string | null;
  issues: Issue[];
  /** The codon at the start, whether or not the rest can be used. */
  first: { codon: string; encodes: string; isStart: boolean } | null;
  coding: CodingWords | null;
  match: ProteinMatch | null;
  suggestions: StartSuggestion[];
}

export interface CodingWords {
  firstResidues: string;
  residues: number;
  /** With the stop codon. */
  lengthBases: number;
  /** First base of the first stop in frame, from 1; null when there is none. */
  stopBase: number | null;
}

const firstResiduesShown = 20;
const nothing: CodingView = {
  records: [],
  bases: null,
  issues: [],
  first: null,
  coding: null,
  match: null,
  suggestions: [],
};

/** Reads pasted DNA, its coding part, and whether it encodes the protein. */
export function viewCoding(input: CodingInput, protein: Protein | undefined): CodingView {
  if (input.dna.trim() === '') return nothing;
  const read = readDnaRecords(input.dna);
  const records = read.value ?? [];
  const [record, another] = records;
  if (!record || another) return { ...nothing, records, issues: read.issues };
  const { bases } = record;
  const table: GeneticCodeId = isGeneticCodeId(input.geneticCode) ? input.geneticCode : 1;
  const { circular } = input;
  const view: CodingView = { ...nothing, records, bases, issues: read.issues };
  if (protein) view.suggestions = suggestStarts({ bases, circular, table, protein: protein.residues });
  const start = input.codingStart;
  if (start === null) return view;
  view.first = firstCodon(bases, start, circular, table);
  const coding = readCoding({ bases, circular, start, table });
  view.issues = [...read.issues, ...coding.issues];
  if (coding.value === null) return view;
  const { value } = coding;
  view.coding = {
    firstResidues: value.protein.slice(0, firstResiduesShown),
    residues: value.protein.length,
    lengthBases: value.length,
    stopBase: value.hasStop ? wrap(value.start + value.length - 3, bases.length) + 1 : null,
  };
  if (!protein) return view;
  const numbering = preferredNumberingOf(protein);
  const match = matchProtein(value, protein.residues, {
    bases,
    labelOf: (index) => labelOfResidue(numbering, index) ?? `#${index + 1}`,
  });
  return { ...view, match: match.value, issues: [...view.issues, ...match.issues] };
}

function firstCodon(bases: string, start: number, circular: boolean, table: GeneticCodeId) {
  const last = circular ? bases.length : bases.length - 2;
  if (start < 1 || start > last) return null;
  const codon = readBases(bases, start - 1, 3, '+');
  return { codon, encodes: translateCodon(codon, table), isStart: isStartCodon(codon, table) };
}

/** One record of several, as FASTA, so that the field holds only what is meant. */
export function asFasta({ name, description, bases }: Pick<DnaRecord, 'name' | 'description' | 'bases'>) {
  const title = name ? `>${[name, description].filter(Boolean).join(' ')}\n` : '';
  return `${title}${bases.replace(/.{60}(?=.)/g, '$&\n')}\n`;
}
