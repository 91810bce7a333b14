import { findDimer, findHairpin, findSelfDimer, stackSumKcalPerMol } from '@/shared/sequence/primers/dimer';
import { readFixtureJson } from '../../support/read-fixture';

interface Checks {
  checks: {
    sequence: string;
    selfDimer: { deltaG37_kcal_mol: number; segment: string; start0: number; threePrimeAnchored: boolean };
    hairpin: { deltaG37_kcal_mol: number; stem?: string; loop?: string; start0?: number; end0?: number };
    last5StackDeltaG37: number;
  }[];
  heteroDimer: {
    a: string;
    b: string;
    result: [number, { segment: string; start0: number; threePrimeAnchored: boolean }];
  };
}

// Computed from the stacks of SantaLucia 1998 and the loops of SantaLucia & Hicks 2004 (the source field of the file).
const { checks, heteroDimer } = readFixtureJson<Checks>('dimer-hairpin-checks.json');

test.each(checks)('self dimer of $sequence', ({ sequence, selfDimer }) => {
  const { best } = findSelfDimer(sequence);
  expect(best?.kcalPerMol).toBeCloseTo(selfDimer.deltaG37_kcal_mol, 2);
  expect(best?.segment).toBe(selfDimer.segment);
  expect(best?.start).toBe(selfDimer.start0);
  expect(best?.threePrimePaired).toBe(selfDimer.threePrimeAnchored);
});

test.each(checks)('hairpin of $sequence', ({ sequence, hairpin }) => {
  const found = findHairpin(sequence);
  expect(found?.kcalPerMol ?? 0).toBeCloseTo(hairpin.deltaG37_kcal_mol, 2);
  expect(found?.stem).toBe(hairpin.stem);
  expect(found?.loop).toBe(hairpin.loop);
  expect(found?.start).toBe(hairpin.start0);
  expect(found?.end).toBe(hairpin.end0);
});

test.each(checks)('last five bases of $sequence', ({ sequence, last5StackDeltaG37 }) => {
  expect(stackSumKcalPerMol(sequence.slice(-5))).toBeCloseTo(last5StackDeltaG37, 2);
});

test('two different primers', () => {
  const { best } = findDimer(heteroDimer.a, heteroDimer.b);
  const [energy, place] = heteroDimer.result;
  expect(best?.kcalPerMol).toBeCloseTo(energy, 2);
  expect(best?.segment).toBe(place.segment);
  expect(best?.start).toBe(place.start0);
});

test('the best pairing that holds a 3′ end is kept apart', () => {
  // GGCC inside is the best; only GT pairs with the 3′ end, too weakly to count.
  const found = findSelfDimer('GTAAAACGACGGCCAGT');
  expect(found.best?.threePrimePaired).toBe(false);
  expect(found.bestAtThreePrime?.kcalPerMol ?? 0).toBeGreaterThan(found.best?.kcalPerMol ?? 0);
});

test('too short a strand has neither', () => {
  expect(findHairpin('ACG')).toBeNull();
  expect(findSelfDimer('A').best).toBeNull();
  expect(findSelfDimer('').best).toBeNull();
});
