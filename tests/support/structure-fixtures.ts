import { readdirSync, readFileSync } from 'node:fs';
import { join } from 'node:path';

const fixtures = join(__dirname, '..', 'fixtures');

export const structureFiles = readdirSync(join(fixtures, 'structures')).filter((name) =>
  name.endsWith('.pdb'),
);

/** A real coordinate file, as bytes. */
export function structureBytes(file: string): Uint8Array {
  return new Uint8Array(readFileSync(join(fixtures, 'structures', file)));
}

/** What an outside library says about it: see `source` in the answer. */
export interface ExpectedChain {
  id: string;
  residues_total: number;
  residues_observed_sequence: number;
  waters: number;
  atoms_one_position: number;
  sequence: string;
  numbers: string[];
  insertion_coded: string[];
  modified: [name: string, label: string][];
  hetero: [name: string, label: string][];
  disordered_atoms: number;
}

export interface ExpectedStructure {
  models: number;
  raw: {
    seqres: Record<string, { length: number; sequence: string }>;
    remark465: number;
    modres: [name: string, chain: string, label: string, parent: string][];
    dbref: string[][];
  };
  chains: ExpectedChain[];
  contacts_4A: {
    chains: [string, string];
    closest: [a: string, b: string, angstrom: number, polymer: 0 | 1][];
  }[];
}

export function expectedStructure(file: string): ExpectedStructure {
  const path = join(fixtures, 'expected', 'structures', `${file}.json`);
  return JSON.parse(readFileSync(path, 'utf8')) as ExpectedStructure;
}
