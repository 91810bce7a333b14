import { AMINO_ACIDS } from '@/shared/sequence/alphabet';
import { MODIFIED_RESIDUES_BY_PARENT } from './modified-residues.data';
import { CAP_NAMES, COMMON_PARENTS, NUCLEOTIDE_LETTERS, WATER_NAMES } from './residue-names.data';

/** What a component id stands for. `letter` and `parent` only where the component is part of a polymer. */
export interface ResidueKind {
  kind: 'amino' | 'nucleotide' | 'water' | 'cap' | 'other';
  letter: string;
  /** Component id of the parent of a modified residue. */
  parent?: string;
}

const known = new Map<string, ResidueKind>();
for (const acid of AMINO_ACIDS) {
  if (acid.letter !== 'X') known.set(acid.code.toUpperCase(), { kind: 'amino', letter: acid.letter });
}
known.set('UNK', { kind: 'amino', letter: 'X' });
for (const [name, letter] of Object.entries(NUCLEOTIDE_LETTERS))
  known.set(name, { kind: 'nucleotide', letter });
for (const name of WATER_NAMES) known.set(name, { kind: 'water', letter: '' });
for (const name of CAP_NAMES) known.set(name, { kind: 'cap', letter: '' });

const codeOfStandardLetter = new Map(AMINO_ACIDS.map((acid) => [acid.letter, acid.code.toUpperCase()]));
for (const [letter, names] of Object.entries(MODIFIED_RESIDUES_BY_PARENT)) {
  const parent = codeOfStandardLetter.get(letter);
  for (const name of names.trim().split(/\s+/)) {
    if (!known.has(name)) known.set(name, { kind: 'amino', letter, parent });
  }
}
for (const [name, parent] of Object.entries(COMMON_PARENTS)) {
  known.set(name, { kind: 'amino', letter: known.get(parent)?.letter ?? 'X', parent });
}

const OTHER: ResidueKind = { kind: 'other', letter: '' };

/**
 * What a component is: the file's own statement of its parent first, then the short table, then the long one
 * (order of authority: the file, common modifications, dictionary). A statement that names the component itself or an unknown parent adds nothing.
 */
export function residueKind(name: string, statedParent?: string): ResidueKind {
  if (statedParent !== undefined && statedParent !== name) {
    const parent = known.get(statedParent);
    if (parent && !parent.parent && (parent.kind === 'amino' || parent.kind === 'nucleotide')) {
      return { kind: parent.kind, letter: parent.letter, parent: statedParent };
    }
  }
  return known.get(name) ?? OTHER;
}

export function isPolymerKind(kind: ResidueKind['kind']): boolean {
  return kind === 'amino' || kind === 'nucleotide';
}
