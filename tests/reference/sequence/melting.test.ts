import { complement } from '@/shared/sequence/construct/bases';
import { meltingOf } from '@/shared/sequence/primers/melting';
import {
  DEFAULT_MELTING_CONDITIONS,
  sodiumEquivalentMillimolar,
  type MeltingConditions,
} from '@/shared/sequence/primers/melting-conditions';
import {
  INTERNAL_MISMATCH,
  REVISED_2004,
  UNIFIED_1998,
} from '@/shared/sequence/primers/nearest-neighbour.data';
import {
  inverseDivalentCorrection,
  inverseMonovalentCorrection,
} from '@/shared/sequence/primers/salt-correction';
import { readFixtureJson } from '../../support/read-fixture';

const TOLERANCE_CELSIUS = 0.1;

interface TmReference {
  primers: { primer: string; tm: Record<string, Record<'NN2' | 'NN3' | 'NN4', number>> }[];
  mismatch: { primer: string; template_3to5: string; tm: Record<string, number> }[];
  self_complementary: { primer: string; tm_Na50_method5_NN3: number }[];
}
interface TmChecks {
  checks: {
    sequence: string;
    gcFraction: number;
    deltaH_kcal_mol: number;
    deltaS_1M_cal_mol_K: number;
    tmCelsius: Record<string, number>;
  }[];
  selfComplementary: {
    sequence: string;
    tmCelsius_1MNa_k_250nM: number;
    tmCelsius_50mMNa_k_250nM_saltSantaLucia1998: number;
  }[];
  internalMismatch: { primer_5to3: string; template_3to5: string; tmCelsius_C: number }[];
  saltTerms: { method: string; correction_perK: number }[];
}

const reference = readFixtureJson<TmReference>('expected/tm.json');
const checks = readFixtureJson<TmChecks>('tm-checks.json');

const conditions = (part: Partial<MeltingConditions>): MeltingConditions => ({
  ...DEFAULT_MELTING_CONDITIONS,
  sodiumMillimolar: 0,
  ...part,
});

/** The settings written in the `source` field of expected/tm.json (Biopython 1.80, Tm_NN). */
const SALTS: Record<string, MeltingConditions> = {
  salt_Na50_method5: conditions({
    salt: 'santalucia',
    sodiumMillimolar: 50,
    oligoNanomolar: 25,
    templateNanomolar: 25,
  }),
  salt_PCR_Owczarzy2008_method7: conditions({
    salt: 'owczarzy-divalent',
    potassiumMillimolar: 50,
    trisMillimolar: 10,
    magnesiumMillimolar: 1.5,
    dntpMillimolar: 0.8,
    oligoNanomolar: 500,
  }),
  salt_Mg2_vonAhsen_method6: conditions({
    salt: 'owczarzy-monovalent',
    sodiumMillimolar: 50,
    trisMillimolar: 10,
    magnesiumMillimolar: 2,
    dntpMillimolar: 0.2,
    oligoNanomolar: 250,
  }),
};
const SETS = { NN2: 'sugimoto1996', NN3: 'unified', NN4: 'revised2004' } as const;

/** Conditions A to G of tm-checks.json. */
const LETTERED: Record<string, MeltingConditions> = {
  A: conditions({ salt: 'none', sodiumMillimolar: 1000, oligoNanomolar: 250, templateNanomolar: 250 }),
  B: conditions({ salt: 'santalucia', sodiumMillimolar: 50, oligoNanomolar: 250, templateNanomolar: 250 }),
  C: conditions({ salt: 'santalucia', sodiumMillimolar: 50, oligoNanomolar: 500 }),
  D: conditions({ salt: 'owczarzy-monovalent', sodiumMillimolar: 50, oligoNanomolar: 500 }),
  E: conditions({
    salt: 'owczarzy-divalent',
    potassiumMillimolar: 50,
    trisMillimolar: 10,
    magnesiumMillimolar: 1.5,
    dntpMillimolar: 0.8,
    oligoNanomolar: 500,
  }),
  F: conditions({
    salt: 'owczarzy-divalent',
    potassiumMillimolar: 50,
    trisMillimolar: 20,
    magnesiumMillimolar: 3,
  }),
  G: conditions({ salt: 'owczarzy-divalent', magnesiumMillimolar: 2 }),
};

/** The table counts palindromes as two different strands, too: the partner is given. */
const asTwoStrands = (bases: string, setting?: MeltingConditions) =>
  meltingOf(bases, setting, complement(bases)).value;

function farthest(pairs: [string, number | undefined, number][]): [string, number] {
  let worst: [string, number] = ['', 0];
  for (const [name, found, expected] of pairs) {
    const distance = found === undefined ? Infinity : Math.abs(found - expected);
    if (distance > worst[1]) worst = [name, distance];
  }
  return worst;
}

describe('melting temperature against Biopython 1.80', () => {
  for (const [salt, setting] of Object.entries(SALTS))
    for (const table of ['NN2', 'NN3', 'NN4'] as const)
      test(`200 primers, ${salt}, ${table}`, () => {
        expect(reference.primers).toHaveLength(200);
        const pairs = reference.primers.map(({ primer, tm }): [string, number | undefined, number] => [
          primer,
          meltingOf(primer, { ...setting, set: SETS[table] }).value?.celsius,
          tm[salt]?.[table] ?? Number.NaN,
        ]);
        expect(farthest(pairs)[1]).toBeLessThanOrEqual(TOLERANCE_CELSIUS);
        expect(pairs.every(([, , expected]) => Number.isFinite(expected))).toBe(true);
      });

  for (const [salt, setting] of Object.entries(SALTS))
    test(`75 primers with a mismatch inside, ${salt}`, () => {
      expect(reference.mismatch).toHaveLength(75);
      const pairs = reference.mismatch.map((row): [string, number | undefined, number] => [
        row.primer,
        meltingOf(row.primer, setting, row.template_3to5).value?.celsius,
        row.tm[salt] ?? Number.NaN,
      ]);
      expect(farthest(pairs)[1]).toBeLessThanOrEqual(TOLERANCE_CELSIUS);
    });

  test('20 self-complementary strands at 50 mM sodium', () => {
    const setting = SALTS.salt_Na50_method5 ?? DEFAULT_MELTING_CONDITIONS;
    const pairs = reference.self_complementary.map((row): [string, number | undefined, number] => [
      row.primer,
      meltingOf(row.primer, setting).value?.celsius,
      row.tm_Na50_method5_NN3,
    ]);
    expect(pairs).toHaveLength(20);
    expect(farthest(pairs)[1]).toBeLessThanOrEqual(TOLERANCE_CELSIUS);
  });

  test.each(Object.keys(LETTERED))('25 primers of the handbook table, condition %s', (letter) => {
    const pairs = checks.checks.map((row): [string, number | undefined, number] => [
      row.sequence,
      asTwoStrands(row.sequence, LETTERED[letter])?.celsius,
      row.tmCelsius[letter] ?? Number.NaN,
    ]);
    expect(pairs).toHaveLength(25);
    expect(farthest(pairs)[1]).toBeLessThanOrEqual(TOLERANCE_CELSIUS);
  });

  test('ΔH and ΔS at 1 M of the same primers', () => {
    for (const row of checks.checks) {
      const melting = asTwoStrands(row.sequence, LETTERED.A);
      expect(melting?.enthalpyKcalPerMol).toBeCloseTo(row.deltaH_kcal_mol, 2);
      expect(melting?.entropyCalPerMolKelvin).toBeCloseTo(row.deltaS_1M_cal_mol_K, 2);
    }
  });

  test('self-complementary strands at 1 M and at 50 mM', () => {
    for (const row of checks.selfComplementary) {
      const molar = meltingOf(row.sequence, conditions({ salt: 'none', oligoNanomolar: 250 })).value;
      const dilute = meltingOf(
        row.sequence,
        conditions({ salt: 'santalucia', sodiumMillimolar: 50, oligoNanomolar: 250 }),
      ).value;
      expect(molar?.selfComplementary).toBe(true);
      expect(Math.abs((molar?.celsius ?? 0) - row.tmCelsius_1MNa_k_250nM)).toBeLessThanOrEqual(
        TOLERANCE_CELSIUS,
      );
      expect(
        Math.abs((dilute?.celsius ?? 0) - row.tmCelsius_50mMNa_k_250nM_saltSantaLucia1998),
      ).toBeLessThanOrEqual(TOLERANCE_CELSIUS);
    }
  });

  test('nine mismatches in one primer, condition C', () => {
    for (const row of checks.internalMismatch) {
      const found = meltingOf(row.primer_5to3, LETTERED.C, row.template_3to5).value?.celsius ?? Number.NaN;
      expect(Math.abs(found - row.tmCelsius_C)).toBeLessThanOrEqual(TOLERANCE_CELSIUS);
    }
  });

  test('the terms of the two salt formulas', () => {
    const [monovalent, divalent] = checks.saltTerms;
    expect(inverseMonovalentCorrection(0.5, conditions({ sodiumMillimolar: 50 }))).toBeCloseTo(
      monovalent?.correction_perK ?? 0,
      10,
    );
    expect(inverseDivalentCorrection(20, 0.5, LETTERED.E ?? DEFAULT_MELTING_CONDITIONS)).toBeCloseTo(
      divalent?.correction_perK ?? 0,
      10,
    );
  });
});

// Acceptance rows 46–48 of the handbook.
describe('acceptance figures', () => {
  test.each([
    ['GTAAAACGACGGCCAGT', 'B', 52.77],
    ['GTAAAACGACGGCCAGT', 'C', 54.97],
    ['ACGTTGCAAGGTCTGACCTA', 'E', 63.38],
  ])('%s under %s melts at %d °C', (bases, letter, expected) => {
    const found = meltingOf(bases, LETTERED[letter]).value?.celsius ?? Number.NaN;
    expect(Math.abs(found - expected)).toBeLessThanOrEqual(TOLERANCE_CELSIUS);
  });

  test('CGCGAATTCGCG with itself, 1 M, 250 nM melts at 59.74 °C', () => {
    const found =
      meltingOf('CGCGAATTCGCG', conditions({ salt: 'none', oligoNanomolar: 250 })).value?.celsius ??
      Number.NaN;
    expect(Math.abs(found - 59.74)).toBeLessThanOrEqual(TOLERANCE_CELSIUS);
  });
});

describe('tables', () => {
  interface Value {
    deltaH_kcal_mol: number;
    deltaS_cal_mol_K: number;
  }
  const file = readFixtureJson<{
    unified_1998: { pairs: Record<string, Value>; init_terminal_GC: Value; init_terminal_AT: Value };
    hicks_2004: { pairs: Record<string, Value>; init: Value; init_terminal_AT: Value };
    internal_mismatch: Record<string, Value>;
  }>('nearest-neighbour.json');
  const plain = (values: Record<string, Value>) =>
    Object.fromEntries(
      Object.entries(values).map(([key, value]) => [key, [value.deltaH_kcal_mol, value.deltaS_cal_mol_K]]),
    );

  test('hold the published values', () => {
    expect(UNIFIED_1998.pairs).toEqual(plain(file.unified_1998.pairs));
    expect(REVISED_2004.pairs).toEqual(plain(file.hicks_2004.pairs));
    expect(INTERNAL_MISMATCH).toEqual(plain(file.internal_mismatch));
    expect(UNIFIED_1998.endAT).toEqual([2.3, 4.1]);
    expect(REVISED_2004.initiation).toEqual([0.2, -5.7]);
  });
});

describe('what cannot be computed', () => {
  const codes = (bases: string, part: Partial<MeltingConditions> = {}, under?: string) =>
    meltingOf(bases, { ...DEFAULT_MELTING_CONDITIONS, ...part }, under).issues.map(({ code }) => code);

  test('says why, with a place', () => {
    expect(codes('')).toEqual(['sequence-too-short']);
    expect(codes('ACGNACGT')).toEqual(['unknown-base']);
    expect(meltingOf('ACGNACGT').issues[0]?.column).toBe(4);
    expect(codes('ACGTACGTAC', {}, 'TGCA')).toEqual(['complement-length']);
    expect(codes('ACGTACGTAC', { templateNanomolar: 500 })).toEqual(['concentration-not-positive']);
    expect(codes('ACGTACGTAC', { sodiumMillimolar: 0 })).toEqual(['salt-not-positive']);
  });

  test('two mismatches side by side have no value, nor has one at an end', () => {
    const bases = 'TGGTCTGAACGCTATCCCGATG';
    const under = complement(bases);
    const swap = (at: number, letters: string) =>
      under.slice(0, at) + letters + under.slice(at + letters.length);
    expect(codes(bases, {}, swap(10, 'AA'))).toEqual(['mismatch-not-in-table']);
    expect(codes(bases, {}, swap(0, 'C'))).toEqual(['mismatch-not-in-table']);
  });

  test('beyond 60 bases the figure is given with a warning', () => {
    const result = meltingOf('ACGTTGCAAG'.repeat(7));
    expect(result.value).not.toBeNull();
    expect(result.issues.map(({ code }) => code)).toEqual(['length-not-meaningful']);
  });

  test('magnesium bound by dNTP adds no sodium equivalent', () => {
    expect(
      sodiumEquivalentMillimolar(
        conditions({ sodiumMillimolar: 50, magnesiumMillimolar: 1, dntpMillimolar: 1 }),
      ),
    ).toBe(50);
    // von Ahsen 2001: 50 + 120·√(2 − 0.2)
    expect(
      sodiumEquivalentMillimolar(
        conditions({ sodiumMillimolar: 50, magnesiumMillimolar: 2, dntpMillimolar: 0.2 }),
      ),
    ).toBeCloseTo(210.997, 3);
  });
});
