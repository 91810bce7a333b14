import { readCoding } from '@/shared/sequence/construct/coding';
import { designComplementaryPair } from '@/shared/sequence/primers/complementary-pair';
import { placeChanges, preparePrimerConstruct, type CodingChange } from '@/shared/sequence/primers/construct';
import { designMutant } from '@/shared/sequence/primers/design-mutant';
import { residueIndex } from '@/shared/sequence/positions';
import { readFixtureJson } from '../../../support/read-fixture';

const file = readFixtureJson<{ construct: string; orfStart0: number; protein: string }>(
  'mutagenesis-checks.json',
);

function prepare(bases: string, start: number, circular = true) {
  const coding = readCoding({ bases, circular, start, table: 11 }).value;
  if (coding === null) throw new Error('the construct cannot be read');
  return preparePrimerConstruct(bases, coding);
}
const construct = prepare(file.construct, file.orfStart0 + 1);
const change = (codon: number, to: string): CodingChange => ({
  residueIndex: residueIndex(codon),
  codon,
  label: String(codon + 1),
  from: file.protein.charAt(codon),
  to,
});
const codes = (issues: readonly { code: string }[]) => issues.map(({ code }) => code);

test('both choices of the codon are shown, with their shares (handbook 9.3)', () => {
  const designs = designComplementaryPair(construct, [change(60, 'N')]).value ?? [];
  const shown = new Map(designs.map(({ changes: [first] }) => [first?.codonTo, first]));
  expect(shown.get('AAC')).toMatchObject({
    codonFrom: 'GAT',
    chosenBy: 'host',
    hostShare: 0.55,
    changedBases: 2,
    codonStart: 232,
  });
  expect(shown.get('AAT')).toMatchObject({
    codonFrom: 'GAT',
    chosenBy: 'fewest',
    hostShare: 0.45,
    changedBases: 1,
  });
});

test('primers are named after the mutant, within what an order takes', () => {
  const [best] =
    designComplementaryPair(construct, [change(60, 'N')], { name: 'β D61N+A62G, a rather long name' })
      .value ?? [];
  for (const { name } of best?.primers ?? []) expect(name).toMatch(/^[A-Za-z0-9_-]{1,30}$/);
});

test('changes too far apart for one pair are refused', () => {
  const { value, issues } = designComplementaryPair(construct, [change(20, 'A'), change(60, 'N')]);
  expect(value).toBeNull();
  expect(codes(issues)).toEqual(['changes-too-far-apart']);
});

test('a change at the end of a linear piece needs more DNA', () => {
  const piece = prepare(file.construct.slice(file.orfStart0), 1, false);
  const { value, issues } = designComplementaryPair(piece, [change(1, 'K')]);
  expect(value).toBeNull();
  expect(codes(issues)).toEqual(['linear-construct', 'too-near-the-end']);
});

test('no primer covers a base that is not settled', () => {
  const bases = `${file.construct.slice(0, 240)}N${file.construct.slice(241)}`;
  const unclear = prepare(bases, file.orfStart0 + 1);
  const { value } = designComplementaryPair(unclear, [change(60, 'N')]);
  expect(value).toBeNull();
  for (const design of designComplementaryPair(unclear, [change(40, 'N')]).value ?? [])
    for (const { bases: letters } of design.primers) expect(letters).toMatch(/^[ACGT]+$/);
});

test('the other schemes are answered with an issue', () => {
  expect(codes(designMutant(construct, [change(60, 'N')], 'back-to-back').issues)).toEqual([
    'scheme-not-yet',
  ]);
  const all = designMutant(construct, [change(60, 'N')], 'all');
  expect(all.value?.length).toBeGreaterThan(0);
  expect(all.issues).toEqual([expect.objectContaining({ code: 'scheme-not-yet', severity: 'warning' })]);
});

test('no change, or one the construct does not hold, is refused', () => {
  expect(codes(designComplementaryPair(construct, []).issues)).toEqual(['no-changes']);
  const mutant = {
    asked: 'E61N',
    changes: [{ residueIndex: residueIndex(60), label: '61', from: 'E', to: 'N' }],
  };
  expect(codes(placeChanges(mutant, construct.coding).issues)).toEqual(['encoded-letter-differs']);
  const far = {
    asked: 'E99N',
    changes: [{ residueIndex: residueIndex(98), label: '99', from: 'E', to: 'N' }],
  };
  expect(codes(placeChanges(far, construct.coding).issues)).toEqual(['residue-not-encoded']);
});

test('designs are plain JSON', () => {
  const [best] = designComplementaryPair(construct, [change(60, 'N')]).value ?? [];
  expect(JSON.parse(JSON.stringify(best))).toEqual(best);
});
