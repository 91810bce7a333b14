import { chooseCodons, RARE_SHARE } from '@/shared/sequence/construct/codon-choice';
import { codonsOf, GENETIC_CODE_IDS, translateCodon } from '@/shared/sequence/construct/genetic-code';

test('both choices encode the new residue and never the old codon, for all codons and tables', () => {
  for (const table of GENETIC_CODE_IDS)
    for (const to of 'ARNDCQEGHILKMFPSTWYV')
      for (const codonFrom of ['GAT', 'TGG', 'ATG', 'CTG']) {
        const { value } = chooseCodons({ codonFrom, to, table, host: 'ecoli' });
        if (value === null) {
          // Met and Trp have one codon in most tables, which may be the old one.
          expect(codonsOf(to, table)).toEqual([codonFrom]);
          continue;
        }
        for (const option of [value.fewest, ...(value.host ? [value.host] : [])]) {
          expect(translateCodon(option.codon, table)).toBe(to);
          expect(option.codon).not.toBe(codonFrom);
        }
        expect(value.fewest.changedBases).toBeLessThanOrEqual(value.host?.changedBases ?? 3);
      }
});

test('rare codons are left out even when they need fewer changes', () => {
  // Lys AAA to Arg: AGA and AGG need fewer changes than CGC, but are rare in E. coli (.04 and .02).
  const { value } = chooseCodons({ codonFrom: 'AAA', to: 'R', table: 11, host: 'ecoli' });
  // Both usable codons change all three bases: the tie goes to the larger share.
  expect(value?.fewest).toMatchObject({ codon: 'CGC', changedBases: 3 });
  expect(value?.host).toMatchObject({ codon: 'CGC', share: 0.4 });
  expect(value?.synonyms.some(({ rare, share }) => rare && (share ?? 1) < RARE_SHARE)).toBe(true);
  // In yeast AGA is the favourite.
  expect(chooseCodons({ codonFrom: 'AAA', to: 'R', table: 1, host: 'yeast' }).value?.host?.codon).toBe('AGA');
});

test('a mitochondrial code has no table of shares, so the fewest changes decide', () => {
  const { value, issues } = chooseCodons({ codonFrom: 'GAC', to: 'E', table: 2, host: 'ecoli' });
  expect(value?.host).toBeNull();
  expect(value?.fewest).toMatchObject({ changedBases: 1, share: null });
  expect(issues.map(({ code }) => code)).toEqual(['no-codon-usage']);
});

test('a letter without a codon is refused', () => {
  expect(chooseCodons({ codonFrom: 'GAC', to: 'U', table: 11, host: 'ecoli' }).issues[0]?.code).toBe(
    'no-codon',
  );
});
