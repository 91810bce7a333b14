import fc from 'fast-check';
import {
  labelOfResidue,
  labelsOf,
  makeNumbering,
  offsetNumbering,
  residueOfLabel,
  segmentsOfLabels,
  sequenceNumbering,
  type Numbering,
} from '@/shared/sequence/numbering/numbering';
import { readLabel } from '@/shared/sequence/numbering/label-text';
import { residueIndex } from '@/shared/sequence/positions';

function expectRoundTrip(numbering: Numbering, length: number): void {
  const labels = labelsOf(numbering, length);
  labels.forEach((label, index) => {
    expect(labelOfResidue(numbering, residueIndex(index))).toBe(label);
    if (label !== null) expect(residueOfLabel(numbering, label)).toBe(index);
  });
  const present = labels.filter((label) => label !== null);
  expect(new Set(present).size).toBe(present.length);
}

// Handbook 2.3 (read in the DBREF records of PDB entry 1COW) and 6.1.
describe('bovine numberings, precursor to mature', () => {
  const precursorOf = (mature: Numbering, label: string) => Number(residueOfLabel(mature, label)) + 1;

  test('β: label 188 is precursor 238, −3 is 47 (row 8)', () => {
    const mature = offsetNumbering(528, -50);
    expect(precursorOf(mature, '188')).toBe(238);
    expect(precursorOf(mature, '-3')).toBe(47);
    expect(precursorOf(mature, '\u22123')).toBe(47);
    expect(precursorOf(mature, '478')).toBe(528);
    expectRoundTrip(mature, 528);
  });

  test('α: label 373 is precursor 416; γ: label 1 is precursor 26 (row 9)', () => {
    expect(precursorOf(offsetNumbering(553, -43), '373')).toBe(416);
    expect(precursorOf(offsetNumbering(298, -25), '1')).toBe(26);
  });

  test('β without a zero: 482 residues are −4 … −1, 1 … 478', () => {
    const mature = offsetNumbering(482, -4, { skipZero: true });
    const labels = labelsOf(mature, 482);
    expect(labels.slice(0, 6)).toEqual(['-4', '-3', '-2', '-1', '1', '2']);
    expect(labels.at(-1)).toBe('478');
    expect(residueOfLabel(mature, '0')).toBeNull();
    expectRoundTrip(mature, 482);
  });

  test('E. coli β, mature without Met: label 155 is place 156 (row 7)', () => {
    expect(precursorOf(offsetNumbering(460, -1), '155')).toBe(156);
  });
});

test('a row named name/13-79 is numbered from 13', () => {
  const numbering = sequenceNumbering(67, 13);
  expect([labelsOf(numbering, 67)[0], labelsOf(numbering, 67).at(-1)]).toEqual(['13', '79']);
  expect(sequenceNumbering(0).segments).toEqual([]);
});

test('insertion letters and missing labels', () => {
  const author = segmentsOfLabels(['51', '52', '52A', '52B', '53', '-1'].map(readLabel));
  expect(author.map((s) => [s.residueIndex, s.length, s.firstNumber, s.suffix])).toEqual([
    [0, 2, 51, ''],
    [2, 1, 52, 'A'],
    [3, 1, 52, 'B'],
    [4, 1, 53, ''],
    [5, 1, -1, ''],
  ]);
  const { value } = makeNumbering(author, 8);
  if (value === null) throw new Error('refused');
  expect(labelsOf(value, 8)).toEqual(['51', '52', '52A', '52B', '53', '-1', null, null]);
  expect(residueOfLabel(value, '52a')).toBeNull();
  expectRoundTrip(value, 8);
});

test('a label is never double, a residue never in two runs, a run never outside', () => {
  const run = (start: number, length: number, firstNumber: number, suffix = '') => ({
    residueIndex: residueIndex(start),
    length,
    firstNumber,
    suffix,
  });
  const codes = (...runs: ReturnType<typeof run>[]) => makeNumbering(runs, 10).issues.map((i) => i.code);
  expect(codes(run(0, 5, 1), run(5, 5, 5))).toEqual(['label-double']);
  expect(codes(run(0, 5, 1), run(5, 5, 5, 'a'))).toEqual([]);
  expect(codes(run(0, 5, 1), run(4, 2, 20))).toEqual(['numbering-overlap']);
  expect(codes(run(6, 5, 1))).toEqual(['numbering-outside']);
  expect(codes(run(0, 1, 1e9))).toEqual(['number-unusable']);
  expect(codes(run(0, 1, 1.5))).toEqual(['number-unusable']);
});

test('label to residue to label holds for every numbering that is accepted', () => {
  const segment = fc.record({
    residueIndex: fc.nat(40).map(residueIndex),
    length: fc.integer({ min: 1, max: 12 }),
    firstNumber: fc.integer({ min: -20, max: 60 }),
    suffix: fc.constantFrom('', '', 'a', 'B'),
  });
  let accepted = 0;
  fc.assert(
    fc.property(fc.array(segment, { maxLength: 4 }), (segments) => {
      const { value } = makeNumbering(segments, 60);
      if (value === null) return;
      accepted += 1;
      expectRoundTrip(value, 60);
    }),
    { numRuns: 500 },
  );
  expect(accepted).toBeGreaterThan(50);
});
