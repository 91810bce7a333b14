import { baseRange, codonRows } from '@/features/plans/codon-rows';
import { tagsOfConstruct } from '@/features/plans/construct-tags';
import { buildProtein, worked, workedConstruct } from './support';

test('each codon of the worked construct stands at its base and names its residue', () => {
  const rows = codonRows(workedConstruct, buildProtein(worked.protein));
  expect(rows).toHaveLength(worked.protein.length + 1);
  expect(rows.map(({ encoded }) => encoded).join('')).toBe(`${worked.protein}*`);
  for (const { codonNumber, codonStart0InConstruct, oldCodon } of worked.cases)
    expect(rows[codonNumber - 1]).toMatchObject({
      base: codonStart0InConstruct,
      bases: oldCodon,
      label: String(codonNumber),
    });
});

test('labels follow the preferred numbering, and a tag has none', () => {
  const tagged = {
    ...workedConstruct,
    encoded: `MHHHHHH${worked.protein.slice(7)}`,
    segments: [{ codonStart: 7, proteinStart: 0, length: worked.protein.length - 7 }],
  };
  const rows = codonRows(tagged, buildProtein(worked.protein, 23));
  expect(rows[0]).toMatchObject({ label: null, residueIndex: null, encoded: 'M' });
  expect(rows[7]).toMatchObject({ label: '23', residueIndex: 0, expected: 'M' });
  expect(tagsOfConstruct(tagged)).toEqual([{ end: 'N', residues: 'MHHHHHH', names: ['polyhistidine'] }]);
});

test('bases are written from 1, and round a circle', () => {
  expect(baseRange(228, 3, 1047)).toBe('229–231');
  expect(baseRange(1046, 3, 1047)).toBe('1047–2');
});
