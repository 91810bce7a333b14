import { linesOf } from '../text-file';

/** What a text file seems to be, by what stands in its first lines. */
export type TextFileKind =
  | 'fasta'
  | 'stockholm'
  | 'blocks'
  | 'pdb'
  | 'mmcif'
  | 'flat-record'
  | 'quality-reads'
  | 'web-page'
  | 'unknown';

const LINES_LOOKED_AT = 60;
const PDB_RECORD =
  /^(HEADER|OBSLTE|TITLE |SPLIT |CAVEAT|COMPND|SOURCE|KEYWDS|EXPDTA|NUMMDL|MDLTYP|AUTHOR|REVDAT|REMARK|DBREF|SEQRES|CRYST1|ORIGX1|SCALE1|MODEL |ATOM {2}|HETATM)/;
const BLOCK_LINE = /^[^\s#>]\S*[ \t]+[A-Za-z.~*?-]{2,}([ \t]+\d+)?[ \t]*$/;

/**
 * Recognises a file from its content, never from its name. Blank lines at the start are passed over.
 * Structural: one PDB record may look like a block line, so records are asked first.
 */
export function recognizeTextFile(text: string): TextFileKind {
  const lines: string[] = [];
  for (const line of linesOf(text)) {
    if (line.text.trim() === '') continue;
    lines.push(line.text);
    if (lines.length === LINES_LOOKED_AT) break;
  }
  const first = lines[0] ?? '';
  if (/^\s*>/.test(first)) return 'fasta';
  if (/^# STOCKHOLM/i.test(first)) return 'stockholm';
  if (/^\s*<(!doctype|html|\?xml)/i.test(first)) return 'web-page';
  if (/^LOCUS\s/.test(first) || /^ID {3}\S/.test(first)) return 'flat-record';
  if (first.startsWith('@') && lines[2]?.startsWith('+')) return 'quality-reads';
  const beyondComments = lines.find((line) => !line.startsWith('#')) ?? '';
  if (/^(data_|loop_|_[a-z])/i.test(beyondComments)) return 'mmcif';
  if (PDB_RECORD.test(first)) return 'pdb';
  const body = lines.slice(1).filter((line) => !/^\s[\s*:.]*$/.test(line));
  const blockLines = body.filter((line) => BLOCK_LINE.test(line)).length;
  if (/multiple sequence alignment/i.test(first) || blockLines * 2 > body.length) return 'blocks';
  return 'unknown';
}
