import fc from 'fast-check';
import { pairsInEveryOptimal } from '@/shared/sequence/mapping/ambiguous-pairs';
import { BLOSUM62_LETTERS, BLOSUM62_ROWS } from '@/shared/sequence/mapping/blosum62.data';
import { alignPair, alignPairWithPaths, type GapRules } from '@/shared/sequence/mapping/pairwise';

/** Every alignment of two short sequences by brute force: its score and its pairs. */
function allAlignments(a: string, b: string, rules: GapRules): { score: number; pairs: string[] }[] {
  const found: { score: number; pairs: string[] }[] = [];
  const walk = (i: number, j: number, steps: string) => {
    if (i === a.length && j === b.length) found.push(scoreOf(a, b, steps, rules));
    if (i < a.length && j < b.length) walk(i + 1, j + 1, `${steps}p`);
    if (i < a.length) walk(i + 1, j, `${steps}a`);
    if (j < b.length) walk(i, j + 1, `${steps}b`);
  };
  walk(0, 0, '');
  return found;
}

function scoreOf(a: string, b: string, steps: string, rules: GapRules): { score: number; pairs: string[] } {
  let [i, j, score] = [0, 0, 0];
  const pairs: string[] = [];
  [...steps].forEach((step, index) => {
    if (step === 'p') {
      const row = BLOSUM62_ROWS[BLOSUM62_LETTERS.indexOf(a[i] ?? '')];
      score += row?.[BLOSUM62_LETTERS.indexOf(b[j] ?? '')] ?? Number.NaN;
      pairs.push(`${i}:${j}`);
    } else {
      const atEnd = step === 'a' ? j === 0 || j === b.length : i === 0 || i === a.length;
      const further = steps[index - 1] === step;
      if (!(rules.ends === 'free' && atEnd)) score -= further ? rules.extendPenalty : rules.openPenalty;
    }
    if (step !== 'b') i += 1;
    if (step !== 'a') j += 1;
  });
  return { score, pairs };
}

const word = fc.string({ unit: fc.constantFrom('A', 'W', 'G', 'D'), maxLength: 5 });
const rules = fc.record({
  openPenalty: fc.constantFrom(0, 1, 3, 10),
  extendPenalty: fc.constantFrom(0, 0.5, 1, 2),
  ends: fc.constantFrom('free' as const, 'global' as const),
});

test('score and sure pairs equal those of a brute-force search over all alignments', () => {
  fc.assert(
    fc.property(word, word, rules, (a, b, gapRules) => {
      const all = allAlignments(a, b, gapRules);
      const best = Math.max(...all.map((alignment) => alignment.score));
      const optimal = all.filter((alignment) => alignment.score === best);
      const { alignment, paths } = alignPairWithPaths(a, b, gapRules);
      expect(alignment.score).toBe(best);
      const inAll = (optimal[0]?.pairs ?? []).filter((p) => optimal.every((one) => one.pairs.includes(p)));
      const sure = [...pairsInEveryOptimal(paths)].flatMap((j, i) => (j === -1 ? [] : [`${i}:${j}`]));
      expect(sure).toEqual(inAll);
    }),
    { numRuns: 300 },
  );
});

test('empty sequences align to nothing, free or at the price of a gap', () => {
  const free = alignPair('', 'MKV');
  expect(free).toMatchObject({ score: 0, aligned: 0, identity: 0, rows: ['---', 'MKV'], segments: [] });
  expect(alignPair('', '').rows).toEqual(['', '']);
  expect(alignPair('MKV', '', { openPenalty: 10, extendPenalty: 0.5, ends: 'global' }).score).toBe(-11);
});

test('U scores as C, O as K, J as L; B, Z, J, X are neither identical nor a mismatch', () => {
  // Source: handbook 3.1 and 5 (selenocysteine and pyrrolysine are not in the matrix).
  expect(alignPair('WUW', 'WCW').score).toBe(11 + 9 + 11);
  expect(alignPair('WOW', 'WKW').score).toBe(11 + 5 + 11);
  expect(alignPair('WJW', 'WLW').score).toBe(11 + 4 + 11);
  expect(alignPair('WXW', 'WXW')).toMatchObject({ identical: 2, determined: 2, aligned: 3, identity: 1 });
});

test('a gap moves to a known break when the score stays the same, and never when it falls', () => {
  const gapRules: GapRules = { openPenalty: 10, extendPenalty: 0.5, ends: 'free' };
  const protein = 'WWWWHAAADEEEEAAAKYYYY';
  const chain = 'WWWWHAAAKYYYY';
  const at = (breaksInA: number[]) => alignPair(chain, protein, { ...gapRules, breaksInA });
  expect(at([5]).rows[0]).toBe('WWWWH--------AAAKYYYY');
  expect(at([7]).rows[0]).toBe('WWWWHAA--------AKYYYY');
  expect(at([5]).score).toBe(alignPair(chain, protein, gapRules).score);
  expect(at([2]).score).toBe(at([]).score);
  expect(at([2]).rows[0]).not.toContain('WW-');
});
