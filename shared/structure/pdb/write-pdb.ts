import type { ParseResult } from '@/shared/sequence/parse-result';
import { IssueList } from '../issue-list';
import { DEFAULT_STRUCTURE_LIMITS } from '../limits';
import { FixedLines } from './fixed-line';
import { writeHeader } from './write-header';
import type { PdbWriteAtom, PdbWriteChain, PdbWriteInput, PdbWriteResidue } from './write-input';

export type { PdbWriteAtom, PdbWriteChain, PdbWriteInput, PdbWriteResidue } from './write-input';

/**
 * Writes PDB format 3.3 (wwPDB, 2012): TITLE, REMARK 465 and 999, DBREF, SEQADV, SEQRES, MODRES, ATOM, HETATM, TER and
 * END in fixed columns of 80, coordinates to 0.001 Å; numbers too large for their columns in hybrid-36. `readPdb`
 * gives back what was written. Null with errors (`field-too-narrow`, `not-a-number`, `chain-twice`) when something
 * does not fit the format. Characters outside ASCII become question marks.
 */
export function writePdb(input: PdbWriteInput): ParseResult<string> {
  const issues = new IssueList(DEFAULT_STRUCTURE_LIMITS.issuesPerCode);
  const lines = new FixedLines(issues);
  if (new Set(input.chains.map((chain) => chain.id)).size < input.chains.length) {
    issues.error('chain-twice', 'Two chains carry the same id.');
  }
  writeHeader(input, lines);
  let serial = 1;
  for (const chain of input.chains) serial = writePolymer(chain, serial, lines);
  for (const chain of input.chains) {
    for (const ligand of chain.ligands ?? []) {
      for (const atom of ligand.atoms) writeAtom('HETATM', serial++, chain.id, ligand, atom, lines);
    }
  }
  lines.add([1, 'END']);
  const found = issues.toArray();
  return { value: found.length > 0 ? null : lines.toText(), issues: found };
}

/** The next free serial number. */
function writePolymer(chain: PdbWriteChain, firstSerial: number, lines: FixedLines): number {
  let serial = firstSerial;
  for (const residue of chain.residues) {
    const record = residue.hetero ? 'HETATM' : 'ATOM  ';
    for (const atom of residue.atoms) writeAtom(record, serial++, chain.id, residue, atom, lines);
  }
  const last = chain.residues[chain.residues.length - 1];
  if (!last) return serial;
  lines.add(
    [1, 'TER'],
    [7, lines.number(serial, 5, 'Serial')],
    [18, lines.right(last.name, 3, 'Component')],
    [22, lines.left(chain.id, 1, 'Chain')],
    [23, lines.number(last.number, 4, 'Residue number')],
    [27, lines.left(last.insertionCode ?? '', 1, 'Insertion code')],
  );
  return serial + 1;
}

function writeAtom(
  record: string,
  serial: number,
  chain: string,
  residue: PdbWriteResidue,
  atom: PdbWriteAtom,
  lines: FixedLines,
): void {
  lines.add(
    [1, record],
    [7, lines.number(serial, 5, 'Serial')],
    [13, nameField(atom, lines)],
    [17, lines.left(atom.alternate ?? '', 1, 'Alternate mark')],
    [18, lines.right(residue.name, 3, 'Component')],
    [22, lines.left(chain, 1, 'Chain')],
    [23, lines.number(residue.number, 4, 'Residue number')],
    [27, lines.left(residue.insertionCode ?? '', 1, 'Insertion code')],
    [31, lines.decimal(atom.x, 8, 3, 'Coordinate')],
    [39, lines.decimal(atom.y, 8, 3, 'Coordinate')],
    [47, lines.decimal(atom.z, 8, 3, 'Coordinate')],
    [55, lines.decimal(atom.occupancy ?? 1, 6, 2, 'Occupancy')],
    [61, lines.decimal(atom.bFactor ?? 0, 6, 2, 'B factor')],
    [77, lines.right(atom.element.toUpperCase(), 2, 'Element')],
  );
}

/** The element ends in column 14, so that ` CA ` is a carbon and `CA  ` calcium; names of four fill the field. */
function nameField(atom: PdbWriteAtom, lines: FixedLines): string {
  const padded = atom.element.length === 1 && atom.name.length < 4 ? ` ${atom.name}` : atom.name;
  return lines.left(padded, 4, 'Atom name');
}
