import fc from 'fast-check';
import { reverseComplement } from '@/shared/sequence/construct/bases';
import { buildPrimingIndex, findMispriming, MISPRIMING_RULES } from '@/shared/sequence/primers/mispriming';

const PRIMER = 'GCTAGGATCCAGTTCAGGTAC';
const END = PRIMER.slice(-15);
const FILL_A = 'TTTTATTATATTATAATTTA';
const FILL_B = 'AATAATTTATAATATTAATA';

/** Filler that holds no G and no C, so that nothing of the primer fits it by chance. */
const among = (site: string) => `${FILL_A}${PRIMER}${FILL_B}${site}${FILL_A}`;
const INTENDED = { strand: '+' as const, threePrime: FILL_A.length + PRIMER.length - 1 };
const find = (bases: string, circular = false) =>
  findMispriming(buildPrimingIndex(bases, circular), PRIMER, INTENDED);

test('the intended place alone is no second place', () => {
  expect(find(among(''))).toEqual([]);
});

test('twelve of the last fifteen with the last five exact', () => {
  const three = `TAG${END.slice(3)}`;
  expect([...three].filter((base, index) => base !== END[index])).toHaveLength(3);
  expect(find(among(three))).toEqual([
    {
      start: FILL_A.length + PRIMER.length + FILL_B.length,
      length: 15,
      strand: '+',
      rule: 'last-15',
      matched: 12,
    },
  ]);
  // One more mismatch before the last ten are whole, or one among the last five, and it does not bind.
  expect(find(among(`${three.slice(0, 7)}G${three.slice(8)}`))).toEqual([]);
  expect(find(among(`${END.slice(0, 12)}C${END.slice(13)}`))).toEqual([]);
});

test('ten exact bases at the end are enough', () => {
  const ten = `AATTT${END.slice(5)}`;
  const [site] = find(among(ten));
  expect(site?.rule).toBe('exact-end');
  expect(site?.matched).toBeGreaterThanOrEqual(MISPRIMING_RULES.exactBases);
});

test('the other strand is searched, with the place on the strand as given', () => {
  const [site, ...others] = find(among(reverseComplement(END)));
  expect(others).toEqual([]);
  expect(site).toMatchObject({
    strand: '-',
    matched: 15,
    start: FILL_A.length + PRIMER.length + FILL_B.length,
  });
});

test('a place across the origin is seen on a circle only', () => {
  const circle = `${END.slice(7)}${FILL_A}${PRIMER}${FILL_B}${END.slice(0, 7)}`;
  const intended = { strand: '+' as const, threePrime: 8 + FILL_A.length + PRIMER.length - 1 };
  const search = (circular: boolean) => findMispriming(buildPrimingIndex(circle, circular), PRIMER, intended);
  expect(search(true)).toEqual([expect.objectContaining({ start: circle.length - 7, matched: 15 })]);
  expect(search(false)).toEqual([]);
});

test('agrees with looking at every place one by one', () => {
  const dna = (min: number, max: number) =>
    fc.string({ unit: fc.constantFrom(...'ACGT'), minLength: min, maxLength: max });
  fc.assert(
    fc.property(dna(30, 300), dna(15, 20), fc.boolean(), fc.nat(), (template, primer, circular, where) => {
      // The primer's end is planted with changes, so that there is something to find.
      const at = where % (template.length - 15);
      const planted = `${template.slice(0, at)}TT${primer.slice(-13)}${template.slice(at + 15)}`;
      const intended = { strand: '+' as const, threePrime: -1 };
      const found = findMispriming(buildPrimingIndex(planted, circular), primer, intended);
      let expected = 0;
      for (const strand of [planted, reverseComplement(planted)])
        for (let last = 0; last < strand.length; last += 1) {
          const fits = Array.from({ length: 15 }, (_, step) => {
            const place = last - step;
            if (place < 0 && !circular) return false;
            return strand[(place + strand.length) % strand.length] === primer[primer.length - 1 - step];
          });
          const seed = fits.slice(0, 5).every(Boolean);
          const enough = fits.filter(Boolean).length >= 12 || fits.slice(0, 10).every(Boolean);
          if (seed && enough) expected += 1;
        }
      expect(found).toHaveLength(expected);
    }),
  );
});
