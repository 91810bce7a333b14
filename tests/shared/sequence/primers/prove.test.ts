import fc from 'fast-check';
import { reverseComplement } from '@/shared/sequence/construct/bases';
import { buildPairProduct } from '@/shared/sequence/primers/pair-product';
import { provePair, type ProofTask } from '@/shared/sequence/primers/prove';
import { readFixtureJson } from '../../../support/read-fixture';

const file = readFixtureJson<{
  construct: string;
  orfStart0: number;
  protein: string;
  cases: { short: string; codonNumber: number; complementaryPair: { forward: string; reverse: string } }[];
}>('mutagenesis-checks.json');
const worked = file.cases.find(({ short }) => short === 'D61N');
const { forward, reverse } = worked?.complementaryPair ?? { forward: '', reverse: '' };
const task: ProofTask = {
  bases: file.construct,
  circular: true,
  coding: { start: file.orfStart0, length: 240, strand: '+', table: 11 },
  asked: [{ codon: 60, to: 'N' }],
};
const codes = (part: Partial<ProofTask>, first = forward, second = reverse) =>
  provePair({ ...task, ...part }, first, second).differences.map(({ code }) => code);

test('the worked pair is proved', () => {
  const proof = provePair(task, forward, reverse);
  expect(proof.proved).toBe(true);
  expect(proof.encodes).toBe(`${file.protein.slice(0, 60)}N${file.protein.slice(61)}`);
});

test('the same pair proves nothing else', () => {
  expect(provePair({ ...task, asked: [{ codon: 60, to: 'E' }] }, forward, reverse).proved).toBe(false);
  expect(provePair(task, forward, forward)).toMatchObject({ proved: false, product: '' });
  expect(codes({ asked: [{ codon: 60, to: 'E' }] })).toEqual(['change-missing']);
  expect(codes({ asked: [] })).toContain('other-residue-changed');
  expect(
    codes({
      asked: [
        { codon: 60, to: 'N' },
        { codon: 58, to: 'A' },
      ],
    }),
  ).toEqual(['change-missing']);
  expect(
    codes({
      asked: [
        { codon: 60, to: 'N' },
        { codon: 500, to: 'A' },
      ],
    }),
  ).toEqual(['change-missing']);
});

test('a wrong letter in the primers is found, silent or not', () => {
  const swap = (text: string, at: number, letter: string) => text.slice(0, at) + letter + text.slice(at + 1);
  // GTC before the codon becomes GTA: still Val, yet another base than asked.
  const silent = swap(forward, 14, 'A');
  expect(codes({}, silent, reverseComplement(silent))).toEqual(['other-base-changed']);
  const second = swap(forward, 13, 'A');
  expect(codes({}, second, reverseComplement(second))).toContain('other-residue-changed');
});

test('a primer one base short or long in the middle loses the frame', () => {
  const short = forward.slice(0, 16) + forward.slice(17);
  expect(codes({}, short, reverseComplement(short))).toEqual(['length-changed']);
  const long = `${forward.slice(0, 16)}A${forward.slice(16)}`;
  expect(codes({}, long, reverseComplement(long))).toEqual(['length-changed']);
});

test('primers that do not pair or do not bind', () => {
  expect(codes({}, forward, forward)).toEqual(['primers-do-not-pair']);
  const foreign = 'ATATATTTAAATATATTTATATAAATTTATA';
  expect(codes({}, foreign, reverseComplement(foreign))).toEqual(['primers-do-not-anneal']);
});

test('a construct that holds the place twice is not provable', () => {
  const doubled = file.construct + file.construct.slice(200, 280);
  expect(codes({ bases: doubled })).toEqual(['primers-anneal-in-several-places']);
});

test('the product begins at the first base wherever the circle is cut, on either strand', () => {
  const wanted = file.construct.slice(0, 232) + 'AAC' + file.construct.slice(235);
  fc.assert(
    fc.property(fc.nat(file.construct.length - 1), fc.boolean(), (turn, flipped) => {
      const turned = (bases: string) => bases.slice(turn) + bases.slice(0, turn);
      const bases = flipped ? reverseComplement(turned(file.construct)) : turned(file.construct);
      const expected = flipped ? reverseComplement(turned(wanted)) : turned(wanted);
      expect(buildPairProduct(bases, true, forward, reverse)).toEqual({ product: expected });
    }),
    {
      numRuns: 200,
      examples: [
        [232, false],
        [233, false],
        [234, true],
        [217, false],
        [250, true],
      ],
    },
  );
});
