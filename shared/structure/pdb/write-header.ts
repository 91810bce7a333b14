import { residueKind } from '../residue-kind';
import type { DatabaseReference, SequenceDifference } from '../types';
import { wrapped, type FixedLines } from './fixed-line';
import type { PdbWriteChain, PdbWriteInput } from './write-input';

const NAMES_PER_LINE = 13;
/** Longest accession that DBREF holds; longer ones need the pair DBREF1 and DBREF2. */
const SHORT_ACCESSION = 8;
const NUMBER_END_SHORT = 99_999;

/** Records before the coordinates, in the order the format asks for. */
export function writeHeader(input: PdbWriteInput, lines: FixedLines): void {
  writeContinued('TITLE', wrapped(input.title, 68), lines);
  for (const remark of input.remarks ?? []) {
    for (const text of wrapped(remark, 68)) lines.add([1, 'REMARK 999'], [12, text]);
  }
  writeMissing(input.chains, lines);
  for (const chain of input.chains) {
    for (const reference of chain.dbref ?? []) writeReference(chain.id, reference, lines);
  }
  for (const chain of input.chains) {
    for (const difference of chain.differences ?? []) writeDifference(chain, difference, lines);
  }
  for (const chain of input.chains) writeDeclared(chain, lines);
  for (const chain of input.chains) writeModified(chain, lines);
}

function writeContinued(record: string, pieces: readonly string[], lines: FixedLines): void {
  for (const [index, text] of pieces.entries()) {
    if (index === 0) lines.add([1, record], [11, text]);
    else lines.add([1, record], [9, lines.right(String(index + 1), 2, 'Number of title lines')], [12, text]);
  }
}

function writeMissing(chains: readonly PdbWriteChain[], lines: FixedLines): void {
  if (chains.every((chain) => (chain.missing ?? []).length === 0)) return;
  lines.add([1, 'REMARK 465']);
  lines.add([1, 'REMARK 465'], [12, 'DECLARED RESIDUES WITHOUT COORDINATES']);
  lines.add([1, 'REMARK 465']);
  lines.add([1, 'REMARK 465'], [14, 'M RES C SSSEQI']);
  for (const chain of chains) {
    for (const { name, number, insertionCode } of chain.missing ?? []) {
      lines.add(
        [1, 'REMARK 465'],
        [16, lines.right(name, 3, 'Component')],
        [20, lines.left(chain.id, 1, 'Chain')],
        [22, lines.number(number, 5, 'Residue number')],
        [27, lines.left(insertionCode ?? '', 1, 'Insertion code')],
      );
    }
  }
}

function writeReference(chain: string, reference: DatabaseReference, lines: FixedLines): void {
  const { begin, end, database, accession, databaseBegin, databaseEnd } = reference;
  const isShort =
    accession.length <= SHORT_ACCESSION &&
    databaseBegin <= NUMBER_END_SHORT &&
    databaseEnd <= NUMBER_END_SHORT;
  const range = [
    [13, lines.left(chain, 1, 'Chain')],
    [15, labelField(begin, lines)],
    [21, labelField(end, lines)],
    [27, lines.left(database, 6, 'Database')],
  ] as const;
  if (isShort) {
    lines.add(
      [1, 'DBREF'],
      ...range,
      [34, lines.left(accession, 8, 'Accession')],
      [56, lines.right(String(databaseBegin), 5, 'Database number')],
      [63, lines.right(String(databaseEnd), 5, 'Database number')],
    );
    return;
  }
  lines.add([1, 'DBREF1'], ...range);
  lines.add(
    [1, 'DBREF2'],
    [13, lines.left(chain, 1, 'Chain')],
    [19, lines.left(accession, 22, 'Accession')],
    [46, lines.right(String(databaseBegin), 10, 'Database number')],
    [58, lines.right(String(databaseEnd), 10, 'Database number')],
  );
}

function writeDifference(chain: PdbWriteChain, difference: SequenceDifference, lines: FixedLines): void {
  const reference = chain.dbref?.[0];
  lines.add(
    [1, 'SEQADV'],
    [13, lines.right(difference.residueName, 3, 'Component')],
    [17, lines.left(chain.id, 1, 'Chain')],
    [19, difference.label === '' ? '     ' : labelField(difference.label, lines)],
    [25, lines.left((reference?.database ?? '').slice(0, 4), 4, 'Database')],
    [30, lines.left((reference?.accession ?? '').slice(0, 9), 9, 'Accession')],
    [40, lines.right(difference.databaseResidue, 3, 'Component')],
    [44, lines.right(difference.databaseNumber, 5, 'Database number')],
    [50, lines.left(difference.comment, 21, 'Comment')],
  );
}

function writeDeclared(chain: PdbWriteChain, lines: FixedLines): void {
  for (let from = 0; from < chain.declared.length; from += NAMES_PER_LINE) {
    const names = chain.declared.slice(from, from + NAMES_PER_LINE);
    lines.add(
      [1, 'SEQRES'],
      [8, lines.number(from / NAMES_PER_LINE + 1, 3, 'Line of SEQRES')],
      [12, lines.left(chain.id, 1, 'Chain')],
      [14, lines.number(chain.declared.length, 4, 'Length of SEQRES')],
      ...names.map((name, index) => [20 + 4 * index, lines.right(name, 3, 'Component')] as const),
    );
  }
}

function writeModified(chain: PdbWriteChain, lines: FixedLines): void {
  for (const residue of chain.residues) {
    const parent = residue.parent ?? (residue.hetero ? residueKind(residue.name).parent : undefined);
    if (parent === undefined) continue;
    lines.add(
      [1, 'MODRES'],
      [13, lines.right(residue.name, 3, 'Component')],
      [17, lines.left(chain.id, 1, 'Chain')],
      [19, lines.number(residue.number, 4, 'Residue number')],
      [23, lines.left(residue.insertionCode ?? '', 1, 'Insertion code')],
      [25, lines.right(parent, 3, 'Component')],
    );
  }
}

/** `52A` as five columns: the number at the right of four, then the insertion code. */
function labelField(label: string, lines: FixedLines): string {
  const parts = /^(-?\d+)([^\d]?)$/.exec(label);
  const number = lines.number(Number(parts?.[1] ?? NaN), 4, 'Residue number');
  return number + lines.left(parts?.[2] ?? '', 1, 'Insertion code');
}
