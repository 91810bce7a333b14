const LOOK_BYTES = 16 * 1024;
const LOOK_LINES = 150;

const PDB_RECORDS = new Set(
  (
    'HEADER OBSLTE TITLE SPLIT CAVEAT COMPND SOURCE KEYWDS EXPDTA NUMMDL MDLTYP AUTHOR REVDAT SPRSDE JRNL REMARK DBREF ' +
    'DBREF1 DBREF2 SEQADV SEQRES MODRES HET HETNAM HETSYN FORMUL HELIX SHEET SSBOND LINK CISPEP SITE CRYST1 ORIGX1 ' +
    'ORIGX2 ORIGX3 SCALE1 SCALE2 SCALE3 MODEL ATOM HETATM ANISOU TER ENDMDL CONECT MASTER END'
  ).split(' '),
);

/** What a file looks like, for a reader that cannot read it to say what was handed over. */
export type ContentKind =
  'empty' | 'binary' | 'gzip' | 'pdb' | 'mmcif' | 'fasta' | 'stockholm' | 'blocks' | 'markup' | 'unknown';

/** The kind of a file's content. Only the beginning is looked at (16 KiB, 150 lines), but for NUL bytes all of it. */
export function sniffContent(bytes: Uint8Array): ContentKind {
  if (bytes[0] === 0x1f && bytes[1] === 0x8b) return 'gzip';
  if (bytes.includes(0)) return 'binary';
  const lines = firstLines(bytes);
  const first = lines.find((line) => line.trim() !== '' && !line.startsWith('#'));
  if (lines.some((line) => line.startsWith('# STOCKHOLM'))) return 'stockholm';
  if (first === undefined) return lines.some((line) => line.trim() !== '') ? 'unknown' : 'empty';
  if (/^(data_|loop_|_\w+\.)/i.test(first) || lines.some((line) => /^_atom_site\./i.test(line)))
    return 'mmcif';
  if (first.startsWith('>')) return 'fasta';
  if (/^\s*<[!?a-z]/i.test(first)) return 'markup';
  if (isRecord(first) || lines.some((line) => ATOM_LINE.test(line))) return 'pdb';
  if (/alignment/i.test(first) || looksLikeBlocks(lines)) return 'blocks';
  return 'unknown';
}

function firstLines(bytes: Uint8Array): string[] {
  let text = '';
  for (const byte of bytes.subarray(0, LOOK_BYTES)) text += String.fromCharCode(byte);
  return text.replace(/^\xef\xbb\xbf/, '').split(/\r\n|\n|\r/, LOOK_LINES);
}

/** ATOM and HETATM may be followed by a serial that overflows into column 6 or 7. */
const ATOM_LINE = /^(ATOM  |ATOM \d|HETATM).{20}/;

function isRecord(line: string): boolean {
  const record = line.slice(0, 6).trimEnd();
  return PDB_RECORDS.has(record) && (record.length === 6 || line.length <= 6 || line[record.length] === ' ');
}

function looksLikeBlocks(lines: string[]): boolean {
  return lines.filter((line) => /^\S+\s+[A-Za-z.-]{10,60}(\s+\d+)?\s*$/.test(line)).length >= 2;
}
