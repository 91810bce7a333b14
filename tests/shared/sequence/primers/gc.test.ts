import { gcAtEnd, gcPercent, longestDinucleotideRepeat, longestRun } from '@/shared/sequence/primers/gc';

test('share of G and C', () => {
  // Handbook 10.6: 16 of 33.
  expect(gcPercent('GTTATGGGTCTGGTCAACGCCATTCCTATGATC')).toBeCloseTo(48.48, 2);
  expect(gcPercent('')).toBe(0);
});

test('G and C at the end', () => {
  expect(gcAtEnd('ATATGCGTC', 2)).toBe(1);
  expect(gcAtEnd('ATATGCGTC', 5)).toBe(4);
});

test('runs and repeats', () => {
  expect(longestRun('ACCCCGGT')).toBe(4);
  expect(longestRun('')).toBe(0);
  expect(longestDinucleotideRepeat('GATATATC')).toBe(3);
  expect(longestDinucleotideRepeat('AAAAAA')).toBe(1);
  expect(longestDinucleotideRepeat('ACGT')).toBe(1);
});
