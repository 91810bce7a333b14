import { readPdb, type ReadPdbOptions } from '@/shared/structure/pdb/read-pdb';

export interface AtomFields {
  record?: 'ATOM' | 'HETATM';
  serial?: string;
  /** Four columns, blanks kept. */
  name?: string;
  alternate?: string;
  residue?: string;
  chain?: string;
  /** Four columns are made of it. */
  number?: number | string;
  insertion?: string;
  x?: number;
  y?: number;
  z?: number;
  occupancy?: string;
  element?: string;
}

/** An atom line, its fields put in their columns by hand: the tests do not lean on the writer. */
export function atom(fields: AtomFields = {}): string {
  const {
    record = 'ATOM',
    serial = '1',
    name = ' CA ',
    alternate = ' ',
    residue = 'ALA',
    chain = 'A',
  } = fields;
  const { number = 1, insertion = ' ', x = 0, y = 0, z = 0, occupancy = '  1.00', element = ' C' } = fields;
  const position = [x, y, z].map((value) => value.toFixed(3).padStart(8)).join('');
  return (
    `${record.padEnd(6)}${serial.padStart(5)} ${name}${alternate}${residue.padStart(3)} ${chain}` +
    `${String(number).padStart(4)}${insertion}   ${position}${occupancy} 10.00          ${element}`
  );
}

/** A run of Cα atoms, 3.8 Å apart, one a residue. */
export function trace(names: string, chain = 'A', first = 1, fields: AtomFields = {}): string[] {
  return names
    .split(' ')
    .map((residue, index) =>
      atom({ residue, chain, number: first + index, x: 3.8 * (first + index), ...fields }),
    );
}

export function seqres(chain: string, names: string): string[] {
  const all = names.split(' ');
  const lines: string[] = [];
  for (let from = 0; from < all.length; from += 13) {
    const row = all.slice(from, from + 13).map((name) => name.padStart(3));
    lines.push(
      `SEQRES ${String(lines.length + 1).padStart(3)} ${chain} ${String(all.length).padStart(4)}  ${row.join(' ')}`,
    );
  }
  return lines;
}

export function bytesOf(...lines: string[]): Uint8Array {
  return new TextEncoder().encode(lines.map((line) => `${line}\n`).join(''));
}

/** Reads lines, with an END. */
export function read(lines: readonly string[], options?: ReadPdbOptions): ReturnType<typeof readPdb> {
  return readPdb(bytesOf(...lines, 'END'), options);
}
