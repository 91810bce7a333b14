import { sniffContent } from '@/shared/structure/sniff';
import { structureBytes, structureFiles } from '@/tests/support/structure-fixtures';

const bytes = (text: string): Uint8Array => new TextEncoder().encode(text);

it.each(structureFiles)('knows %s by its content', (file) => {
  expect(sniffContent(structureBytes(file))).toBe('pdb');
});

it('knows mmCIF with and without a block name, whatever stands above it', () => {
  expect(sniffContent(bytes('data_1ABC\n#\n_entry.id 1ABC\n'))).toBe('mmcif');
  expect(sniffContent(bytes('# comment\n\nloop_\n_atom_site.group_PDB\n'))).toBe('mmcif');
  expect(sniffContent(bytes('\ufeffDATA_x\n'))).toBe('mmcif');
});

it.each([
  ['>name\nMKLV\n', 'fasta'],
  ['>END\nMODEL\n', 'fasta'],
  ['# STOCKHOLM 1.0\n', 'stockholm'],
  ['alpha  MKLVAAGIVGLA\nbeta   MKLVAAGIVGLA\n', 'blocks'],
  ['<?xml version="1.0"?>', 'markup'],
  ['Ending is not a record\n', 'unknown'],
  ['ATOMIC weights\n', 'unknown'],
  ['', 'empty'],
  ['a\0b', 'binary'],
])('takes %j for no coordinates', (text, kind) => {
  expect(sniffContent(bytes(text))).toBe(kind);
});

it('knows a PDB file of atom lines alone, a serial run into the record name included', () => {
  const line = '111757  CG3 VAL B  52       7.588  -6.386  43.856  1.00 23.53           C';
  expect(sniffContent(bytes(`ATOM ${line}\n`))).toBe('pdb');
});
