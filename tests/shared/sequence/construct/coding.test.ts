import fc from 'fast-check';
import { readBases, reverseComplement } from '@/shared/sequence/construct/bases';
import { readCoding, type CodingRequest } from '@/shared/sequence/construct/coding';
import { translate } from '@/shared/sequence/construct/genetic-code';

// An invented gene of 34 codons and a stop, with ten bases before and six behind.
const GENE = `ATG${'GAAGATCTGAAAGCG'.repeat(6)}TTTCATTGGTAA`;
const PROTEIN = `M${'EDLKA'.repeat(6)}FHW`;
const BASES = `CCTTAGGATC${GENE}GGATCC`;

const read = (part: Partial<CodingRequest> = {}) =>
  readCoding({ bases: BASES, circular: false, start: 11, table: 11, ...part });
const codes = (part: Partial<CodingRequest> = {}) => read(part).issues.map(({ code }) => code);

test('reads from the start to the first stop in frame, counting from 1', () => {
  const { value, issues } = read();
  expect(issues).toEqual([]);
  expect(value).toMatchObject({
    start: 10,
    length: GENE.length,
    hasStop: true,
    protein: PROTEIN,
    literal: `${PROTEIN}*`,
    strand: '+',
  });
  expect(value?.codonStarts[0]).toBe(10);
  expect(value?.codonStarts[33]).toBe(10 + 99);
  expect(value?.codonStarts).toHaveLength(34);
});

test('an end that is given includes the stop codon', () => {
  expect(read({ end: 10 + GENE.length }).value?.protein).toBe(PROTEIN);
  expect(codes({ end: 10 + GENE.length })).toEqual([]);
  expect(codes({ end: 7 + GENE.length })).toEqual(['no-final-stop']);
});

test('a length that is no multiple of three is not in frame', () => {
  const { value, issues } = read({ end: 9 + GENE.length });
  expect(value).toBeNull();
  expect(issues[0]).toMatchObject({ code: 'not-in-frame', severity: 'error' });
  expect(issues[0]?.message).toContain('104 bases, 2 more than 34 whole codons');
});

test('an inner stop is named with its base and codon', () => {
  const broken = BASES.replace('CTGAAAGCG', 'CTGTAAGCG');
  const { value, issues } = read({ bases: broken, end: 10 + GENE.length });
  expect(value).toBeNull();
  expect(issues[0]).toMatchObject({ code: 'inner-stop', residue: '5' });
  expect(issues[0]?.message).toContain('TAA at base 23 (codon 5)');
  // Without an end the reading stops there, and that is said.
  expect(read({ bases: broken }).value?.protein).toBe('MEDL');
  expect(codes({ bases: broken })).toEqual(['short-frame']);
});

test('no start codon and no final stop are warnings', () => {
  expect(codes({ start: 14 })).toEqual(['no-start-codon']);
  expect(
    read({ bases: BASES.slice(0, 10 + 99) }).issues.map(({ code, severity }) => [code, severity]),
  ).toEqual([['no-final-stop', 'warning']]);
});

test('another start codon of the table reads Met at the start only, beside its literal meaning', () => {
  const bases = BASES.replace('ATGGAA', 'GTGGTG');
  const { value, issues } = read({ bases });
  expect(value?.protein.slice(0, 3)).toBe('MVD');
  expect(value?.literal.slice(0, 3)).toBe('VVD');
  expect(issues.map(({ code }) => code)).toEqual(['start-read-as-methionine']);
});

test.each([0, -1, 1.5, Number.NaN, BASES.length + 1])('a start at %d lies outside', (start) => {
  expect(codes({ start })).toEqual(['start-outside']);
});

test('an end outside, or before the start of a linear construct', () => {
  expect(codes({ end: BASES.length + 1 })).toEqual(['end-outside']);
  expect(codes({ start: 20, end: 11 })).toEqual(['end-before-start']);
});

test('empty, foreign and too short DNA', () => {
  expect(codes({ bases: '' })).toEqual(['empty']);
  expect(codes({ bases: 'ATG!AA', start: 1 })).toEqual(['unknown-base']);
  expect(codes({ bases: 'ATGA', start: 3 })).toEqual(['no-codons']);
  expect(codes({ bases: 'TAAATG', start: 1 })).toEqual(['no-codons']);
});

test('a codon with a base that is not settled reads X, with a warning', () => {
  const { value, issues } = read({ bases: BASES.replace('GATCTG', 'GANCTG') });
  expect(value?.protein.charAt(2)).toBe('X');
  expect(issues).toEqual([expect.objectContaining({ code: 'ambiguous-codons', residue: '3' })]);
});

test('in the vertebrate mitochondrial code a last T or TA is completed by the tail, elsewhere it is out of frame', () => {
  const bases = `ATG${'GAC'.repeat(40)}TA`;
  expect(
    readCoding({ bases, circular: false, start: 1, end: bases.length, table: 2 }).issues.map(
      ({ code }) => code,
    ),
  ).toEqual(['stop-completed-by-tail', 'no-final-stop']);
  expect(readCoding({ bases, circular: false, start: 1, end: bases.length, table: 1 }).value).toBeNull();
});

test('the same gene is read wherever the circle is cut and on either strand', () => {
  fc.assert(
    fc.property(fc.nat(BASES.length - 1), fc.boolean(), fc.boolean(), (turn, flipped, withEnd) => {
      const turned = BASES.slice(turn) + BASES.slice(0, turn);
      const bases = flipped ? reverseComplement(turned) : turned;
      const size = bases.length;
      const place = (index: number) => {
        const along = (index - turn + 2 * size) % size;
        return (flipped ? size - 1 - along : along) + 1;
      };
      const { value } = readCoding({
        bases,
        circular: true,
        start: place(10),
        ...(withEnd ? { end: place(10 + GENE.length - 1) } : {}),
        table: 11,
        strand: flipped ? '-' : '+',
      });
      expect(value?.protein).toBe(PROTEIN);
      expect(value?.length).toBe(GENE.length);
      for (const [codon, start] of (value?.codonStarts ?? []).entries())
        expect(translate(readBases(bases, start, 3, flipped ? '-' : '+'), 11)).toBe(PROTEIN.charAt(codon));
    }),
  );
});

test('any request gives a coding part or an error, never an exception', () => {
  fc.assert(
    fc.property(
      fc.string({ unit: fc.constantFrom(...'ACGTN'), maxLength: 80 }),
      fc.integer({ min: -5, max: 90 }),
      fc.option(fc.integer({ min: -5, max: 90 }), { nil: undefined }),
      fc.boolean(),
      fc.constantFrom('+' as const, '-' as const),
      (bases, start, end, circular, strand) => {
        const { value, issues } = readCoding({
          bases,
          circular,
          start,
          ...(end === undefined ? {} : { end }),
          table: 11,
          strand,
        });
        expect(value === null).toBe(issues.some(({ severity }) => severity === 'error'));
        if (value) expect(value.literal).toHaveLength(value.length / 3);
      },
    ),
  );
});
