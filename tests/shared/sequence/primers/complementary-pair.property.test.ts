import fc from 'fast-check';
import { readCoding } from '@/shared/sequence/construct/coding';
import { designComplementaryPair } from '@/shared/sequence/primers/complementary-pair';
import { preparePrimerConstruct, type CodingChange } from '@/shared/sequence/primers/construct';
import { PAIR_LIMITS } from '@/shared/sequence/primers/limits';
import type { Design } from '@/shared/sequence/primers/types';
import { residueIndex } from '@/shared/sequence/positions';
import { readFixtureJson } from '../../../support/read-fixture';

// Everything below the designs is worked out anew from NCBI's tables, by plain loops, so that a shared mistake cannot hide.
const tables = readFixtureJson<{ codes: Record<string, { aminoAcids: string }> }>('genetic-codes.json').codes;
const ORDER = 'TCAG';
const readCodon = (codon: string, table: number) =>
  tables[String(table)]?.aminoAcids.charAt(
    16 * ORDER.indexOf(codon.charAt(0)) + 4 * ORDER.indexOf(codon.charAt(1)) + ORDER.indexOf(codon.charAt(2)),
  ) ?? '?';
const PAIR: Record<string, string> = { A: 'T', C: 'G', G: 'C', T: 'A' };
const otherStrand = (bases: string) =>
  [...bases]
    .reverse()
    .map((base) => PAIR[base] ?? base)
    .join('');

const TABLES = [1, 2, 3, 4, 5, 11] as const;
const RESIDUES = 'ACDEFGHIKLMNPQRSTVWY';

interface Plasmid {
  bases: string;
  start: number;
  strand: '+' | '-';
  circular: boolean;
  table: (typeof TABLES)[number];
  protein: string;
}

/** An invented plasmid: a gene of random codons amid random bases, cut anywhere, on either strand. */
const plasmid = fc
  .record({
    codons: fc.array(fc.string({ unit: fc.constantFrom(...'ACGT'), minLength: 3, maxLength: 3 }), {
      minLength: 40,
      maxLength: 80,
    }),
    before: fc.string({ unit: fc.constantFrom(...'ACGT'), minLength: 40, maxLength: 120 }),
    behind: fc.string({ unit: fc.constantFrom(...'ACGT'), minLength: 40, maxLength: 120 }),
    table: fc.constantFrom(...TABLES),
    circular: fc.boolean(),
    flipped: fc.boolean(),
    turn: fc.nat(),
  })
  .map(({ codons, before, behind, table, circular, flipped, turn }): Plasmid => {
    const sense = codons.filter((codon) => readCodon(codon, table) !== '*');
    const gene = `ATG${sense.join('')}TAA`;
    const whole = before + gene + behind;
    const cut = circular ? turn % whole.length : 0;
    const turned = whole.slice(cut) + whole.slice(0, cut);
    const along = (before.length - cut + whole.length) % whole.length;
    return {
      bases: flipped ? otherStrand(turned) : turned,
      start: (flipped ? whole.length - 1 - along : along) + 1,
      strand: flipped ? '-' : '+',
      circular,
      table,
      protein: `M${sense.map((codon) => readCodon(codon, table)).join('')}`,
    };
  });

/** Protein of a DNA by walking base by base from the start. */
function readBack(dna: string, { start, strand, table, protein }: Plasmid): string {
  let read = '';
  for (let codon = 0; codon <= protein.length; codon += 1) {
    let letters = '';
    for (let step = 0; step < 3; step += 1) {
      const away = 3 * codon + step;
      const place = strand === '+' ? start - 1 + away : start - 1 - away;
      const base = dna.charAt(((place % dna.length) + dna.length) % dna.length);
      letters += strand === '+' ? base : (PAIR[base] ?? base);
    }
    read += readCodon(letters, table);
  }
  return read;
}

/** The template with the forward primer written over the place it states. */
function overwrite(design: Design, { bases }: Plasmid): string {
  const [forward] = design.primers;
  if (!forward) return '';
  const written = forward.strand === '+' ? forward.bases : otherStrand(forward.bases);
  const result = [...bases];
  for (const [step, base] of [...written].entries()) result[(forward.start + step) % bases.length] = base;
  return result.join('');
}

function designAll(made: Plasmid, wanted: readonly [number, string][]) {
  const coding = readCoding({ ...made, table: made.table }).value;
  if (coding === null) throw new Error('the invented gene cannot be read');
  expect(coding.protein).toBe(made.protein);
  const changes: CodingChange[] = wanted.map(([codon, to]) => ({
    residueIndex: residueIndex(codon),
    codon,
    label: String(codon + 1),
    from: made.protein.charAt(codon),
    to,
  }));
  return designComplementaryPair(preparePrimerConstruct(made.bases, coding), changes, { name: 'made' });
}

function expectProved(design: Design, made: Plasmid, wanted: readonly [number, string][]): void {
  const expected = [...made.protein];
  for (const [codon, to] of wanted) expected[codon] = to;
  expect(design.proved).toBe(true);
  expect(readBack(design.product, made)).toBe(`${expected.join('')}*`);
  expect(design.encodes).toBe(expected.join(''));
  expect(overwrite(design, made)).toBe(design.product);
  const [forward, reverse] = design.primers;
  expect(otherStrand(forward?.bases ?? '')).toBe(reverse?.bases);
  expect(forward?.start).toBe(reverse?.start);
  expect(new Set([forward?.strand, reverse?.strand])).toEqual(new Set(['+', '-']));
}

test('every design of a random change in a random construct encodes that change and no other', () => {
  let designs = 0;
  fc.assert(
    fc.property(plasmid, fc.nat(), fc.constantFrom(...RESIDUES), (made, where, to) => {
      const codon = 1 + (where % (made.protein.length - 1));
      if (made.protein.charAt(codon) === to) return;
      const result = designAll(made, [[codon, to]]);
      for (const design of result.value ?? []) expectProved(design, made, [[codon, to]]);
      designs += result.value?.length ?? 0;
      if (result.value === null)
        expect(result.issues.some(({ severity }) => severity === 'error')).toBe(true);
    }),
    { numRuns: 250 },
  );
  // The property would hold of nothing at all, too.
  expect(designs).toBeGreaterThan(600);
});

test('so does every design of two changes near one another', () => {
  let designs = 0;
  fc.assert(
    fc.property(
      plasmid,
      fc.nat(),
      fc.integer({ min: 1, max: 6 }),
      fc.constantFrom(...RESIDUES),
      fc.constantFrom(...RESIDUES),
      (made, where, apart, first, second) => {
        const codon = 1 + (where % (made.protein.length - 8));
        const wanted: [number, string][] = [
          [codon, first],
          [codon + apart, second],
        ];
        if (wanted.some(([place, to]) => made.protein.charAt(place) === to)) return;
        const result = designAll(made, wanted);
        for (const design of result.value ?? []) expectProved(design, made, wanted);
        designs += result.value?.length ?? 0;
      },
    ),
    { numRuns: 120 },
  );
  expect(designs).toBeGreaterThan(200);
});

test('designs within all limits come first, the others name the check they missed', () => {
  fc.assert(
    fc.property(plasmid, fc.nat(), fc.constantFrom(...RESIDUES), (made, where, to) => {
      const codon = 1 + (where % (made.protein.length - 1));
      if (made.protein.charAt(codon) === to) return;
      const designs = designAll(made, [[codon, to]]).value ?? [];
      const within = designs.map(({ withinLimits }) => withinLimits);
      expect(within).toEqual([...within].sort((a, b) => Number(b) - Number(a)));
      expect(designs.map(({ rank }) => rank)).toEqual(designs.map((_, index) => index + 1));
      for (const { withinLimits, checks, reasons, primers } of designs) {
        const missed = checks.filter(({ severity, passed }) => severity === 'limit' && !passed);
        expect(withinLimits).toBe(missed.length === 0);
        for (const { label } of missed)
          expect(reasons.some((reason) => reason.includes('failed') && reason.includes(label))).toBe(true);
        if (!withinLimits) continue;
        const bases = primers[0]?.bases ?? '';
        const strong = [...bases].filter((base) => base === 'G' || base === 'C').length;
        expect(bases.length).toBeGreaterThanOrEqual(PAIR_LIMITS.shortestBases);
        expect(bases.length).toBeLessThanOrEqual(PAIR_LIMITS.longestBases);
        expect(strong / bases.length).toBeGreaterThanOrEqual(0.4);
        expect(bases).toMatch(/^[GC].*[GC]$/);
      }
    }),
    { numRuns: 100 },
  );
});
