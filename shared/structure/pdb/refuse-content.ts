import type { IssueList } from '../issue-list';
import type { StructureLimits } from '../limits';
import { sniffContent, type ContentKind } from '../sniff';

const WRONG_KINDS: Partial<Record<ContentKind, string>> = {
  gzip: 'a gzip file: unpack it first',
  mmcif: 'a PDBx/mmCIF file, not PDB format',
  fasta: 'sequences in FASTA, not coordinates',
  stockholm: 'an alignment in Stockholm format, not coordinates',
  blocks: 'an alignment in blocks, not coordinates',
  markup: 'a web page or XML, not coordinates',
  unknown: 'not in PDB format: no record of it was found at the beginning',
};

/** Tells with an error, and true, when a file is not worth reading line by line. */
export function refuseContent(bytes: Uint8Array, limits: StructureLimits, issues: IssueList): boolean {
  if (bytes.length > limits.bytes) {
    issues.error('too-many-bytes', `The file has ${bytes.length} bytes; at most ${limits.bytes} are read.`);
    return true;
  }
  const kind = sniffContent(bytes);
  if (kind === 'pdb') return false;
  if (kind === 'empty') issues.error('empty', 'The file is empty.');
  else if (kind === 'binary') issues.error('binary', 'The file is not text: it holds NUL bytes.');
  else issues.error('wrong-kind', `This is ${WRONG_KINDS[kind] ?? 'something else'}.`, { line: 1 });
  return true;
}
