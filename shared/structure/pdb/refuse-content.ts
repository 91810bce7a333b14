import type { IssueList } from '../issue-list';
import type { StructureLimits } from '../limits';
import { sniffContent, type ContentKind } from '../sniff';

const asAlignment = 'Upload it as an alignment, and the coordinates here.';
const WRONG_KINDS: Partial<Record<ContentKind, string>> = {
  gzip: 'This is a gzip file. Unpack it first.',
  mmcif: 'This is a PDBx/mmCIF file, not PDB format. Save it in PDB format and upload that file.',
  fasta: `This is sequences in FASTA, not coordinates. ${asAlignment}`,
  stockholm: `This is an alignment in Stockholm format, not coordinates. ${asAlignment}`,
  blocks: `This is an alignment in blocks, not coordinates. ${asAlignment}`,
  markup:
    'This is a web page or XML, perhaps an error page saved in place of the file. Choose the coordinate file.',
};
const unknownKind =
  'This is not in PDB format: no record of it was found at the beginning. Choose the coordinate file.';

/** Tells with an error, and true, when a file is not worth reading line by line. */
export function refuseContent(bytes: Uint8Array, limits: StructureLimits, issues: IssueList): boolean {
  if (bytes.length > limits.bytes) {
    issues.error('too-many-bytes', `The file has ${bytes.length} bytes; at most ${limits.bytes} are read.`);
    return true;
  }
  const kind = sniffContent(bytes);
  if (kind === 'pdb') return false;
  if (kind === 'empty') issues.error('empty', 'The file is empty. Choose the file again, or save it anew.');
  else if (kind === 'binary')
    issues.error(
      'binary',
      'The file is not text: it holds NUL bytes. Save the coordinates in PDB format and upload that file.',
    );
  else issues.error('wrong-kind', WRONG_KINDS[kind] ?? unknownKind, { line: 1 });
  return true;
}
