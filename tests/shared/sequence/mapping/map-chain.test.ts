import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import type { CandidateProtein, MappableChain } from '@/shared/sequence/mapping/chain-types';
import { mapChainTo } from '@/shared/sequence/mapping/map-chain';
import { matchChains } from '@/shared/sequence/mapping/match-chains';
import { proposeProtein } from '@/shared/sequence/mapping/propose-protein';

const { sequences } = JSON.parse(
  readFileSync(join(__dirname, '../../../fixtures/alignment-checks.json'), 'utf8'),
) as { sequences: Record<string, string> };
const sequence = (name: string) => sequences[name] ?? '';

function chainOf(
  letters: string,
  extra: Partial<MappableChain> & { firstNumber?: number } = {},
): MappableChain {
  const { firstNumber = 1, ...rest } = extra;
  const residues = [...letters].map((letter, index) => ({ letter, label: String(firstNumber + index) }));
  return { id: 'A', residues, differences: [], ...rest };
}

const protein = (name: string, family = name, residues = sequence(name)): CandidateProtein => ({
  id: name,
  name,
  family,
  residues,
});

function map(chain: MappableChain, target: CandidateProtein) {
  const found = mapChainTo(chain, target);
  if (found === null) throw new Error('not aligned');
  return found;
}

const proposal = (chain: MappableChain, candidates: CandidateProtein[]) => {
  const [match] = matchChains([chain], candidates);
  if (match === undefined) throw new Error('no match');
  return proposeProtein(match, candidates);
};

const cEcoli = protein('c_ecoli', 'c');

// Handbook 5, rows 25 to 27 of its acceptance checks (scores: Biopython 1.80; tag rule: trap b).
describe('E. coli c on changed chains', () => {
  test('residues 39 to 47 cut out: one gap of nine, 70 of 70 identical, score 325 (row 25)', () => {
    const found = map(chainOf(sequence('c_ecoli_gap38_47')), cEcoli);
    expect(found).toMatchObject({ score: 325, identical: 70, aligned: 70, identity: 1, coverage: 1 });
    expect(found.segments).toHaveLength(2);
    const [first, second] = found.segments;
    expect(Number(second?.proteinStart) - Number(first?.proteinStart) - Number(first?.length)).toBe(9);
  });

  test('a 20-residue tag in place of Met1 lies outside the protein, without a mismatch at 1 (row 26)', () => {
    const found = map(chainOf(sequence('tagged_c_ecoli')), cEcoli);
    expect(found.segments).toEqual([{ chainStart: 20, proteinStart: 1, length: 78 }]);
    expect(found.exceptions.filter((one) => one.kind !== 'tag')).toEqual([]);
    expect(found.exceptions).toHaveLength(20);
    expect(found).toMatchObject({ identical: 78, aligned: 78, identity: 1 });
  });

  test('the same, but the file calls the residue before Glu2 engineered: the mismatch stays', () => {
    const differences = [{ label: '20', comment: 'ENGINEERED MUTATION' }];
    const found = map(chainOf(sequence('tagged_c_ecoli'), { differences }), cEcoli);
    expect(found.exceptions.filter((one) => one.kind === 'engineered')).toMatchObject([
      { label: '20', chainLetter: 'H', proteinIndex: 0, proteinLetter: 'M', note: 'ENGINEERED MUTATION' },
    ]);
  });

  test('D61N: 78 match, one mismatch; engineered when the file says so (row 27)', () => {
    const letters = sequence('c_ecoli_D61N');
    const plain = map(chainOf(letters), cEcoli);
    expect(plain).toMatchObject({ identical: 78, aligned: 79, coverage: 1 });
    expect(plain.exceptions).toEqual([
      {
        kind: 'mismatch',
        chainIndex: 60,
        label: '61',
        chainLetter: 'N',
        proteinIndex: 60,
        proteinLetter: 'D',
      },
    ]);
    const differences = [{ label: '61', comment: 'ENGINEERED MUTATION' }];
    const stated = map(chainOf(letters, { differences }), cEcoli);
    expect(stated.exceptions.map((one) => one.kind)).toEqual(['engineered']);
  });
});

describe('verdicts of single residues', () => {
  test('a modified residue with the protein’s letter as parent; unknown ones are undetermined', () => {
    const residues = [...'MENLNMDL'].map((letter, index) => ({ letter, label: String(index + 1) }));
    const chain = chainOf('', {
      residues: residues.map((residue, index) =>
        index === 0 ? { ...residue, parent: 'MET' } : index === 3 ? { ...residue, letter: 'X' } : residue,
      ),
    });
    const found = map(chain, cEcoli);
    expect(found.exceptions.map((one) => [one.kind, one.label])).toEqual([
      ['modified', '1'],
      ['undetermined', '4'],
    ]);
    expect(found).toMatchObject({ identical: 7, determined: 7, aligned: 8, identity: 1 });
  });

  test('segments end at an unobserved stretch even where the protein lacks nothing', () => {
    const residues = [...sequence('c_ecoli')].map((letter, index) => ({
      letter,
      label: String(index + 1),
      declaredIndex: index < 30 ? index : index + 5,
    }));
    expect(map(chainOf('', { residues }), cEcoli).segments).toEqual([
      { chainStart: 0, proteinStart: 0, length: 30 },
      { chainStart: 30, proteinStart: 30, length: 49 },
    ]);
  });

  test('a gap goes to the chain break, and then nothing there is ambiguous', () => {
    // Residues 14, 15, 16 of this protein are AAA, as are 20, 21, 22: the gap could lie before or behind them.
    const target = protein('p', 'p', 'MENLNMDLLYWKRAAADEFAAAHIPLLRTQ');
    const whole = [...target.residues].map((letter, index) => ({ letter, label: String(index + 1) }));
    const seen = whole.filter((_, index) => index < 13 || index > 18);
    const found = map(chainOf('', { residues: seen }), target);
    expect(found.segments).toEqual([
      { chainStart: 0, proteinStart: 0, length: 13 },
      { chainStart: 13, proteinStart: 19, length: 11 },
    ]);
    expect(found.exceptions).toEqual([]);
    const unbroken = map(chainOf(seen.map((residue) => residue.letter).join('')), target);
    expect(unbroken.exceptions.map((one) => [one.kind, one.label])).toEqual([
      ['ambiguous', '14'],
      ['ambiguous', '15'],
      ['ambiguous', '16'],
    ]);
  });
});

// Thresholds: handbook 5.7 [common practice, no source].
describe('what a chain is proposed to be', () => {
  const alpha = protein('alpha_ecoli', 'α');
  const beta = protein('beta_ecoli', 'β');
  const all = [cEcoli, alpha, beta, protein('a_ecoli', 'a')];
  /** The chain with every n-th letter changed. */
  const changed = (letters: string, every: number) =>
    [...letters]
      .map((letter, i) => (i % every === every - 1 ? (letter === 'W' ? 'D' : 'W') : letter))
      .join('');

  test('its own protein; the rival α of β is known and far', () => {
    const found = proposal(chainOf(sequence('beta_ecoli')), all);
    expect(found).toMatchObject({ outcome: 'matched', reason: 'certain', family: 'β' });
    expect(found.best?.proteinId).toBe('beta_ecoli');
    expect(found.rival?.proteinId).toBe('alpha_ecoli');
    expect(found.rival?.identity).toBeGreaterThan(0.15);
    expect(found.rival?.identity).toBeLessThan(0.3);
    expect(found.words).toContain('100 % identical');
  });

  test('one mutation: matched, with the mismatch named', () => {
    const found = proposal(chainOf(sequence('c_ecoli_D61N')), all);
    expect(found).toMatchObject({ outcome: 'matched', reason: 'mismatches' });
    expect(found.words).toContain('one mismatch');
  });

  test('the tagged c: its histidines prove the tag, so the tag does not lower the coverage', () => {
    const found = proposal(chainOf(sequence('tagged_c_ecoli')), all);
    expect(found).toMatchObject({ outcome: 'matched', reason: 'certain' });
    expect(found.best?.coverage).toBeCloseTo(78 / 98, 6);
  });

  test('a homolog: the family only, never the protein', () => {
    const found = proposal(chainOf(sequence('c_ps3')), all);
    expect(found).toMatchObject({ outcome: 'family-only', family: 'c', reason: 'new-or-homolog' });
    expect(proposal(chainOf(changed(sequence('beta_ecoli'), 12)), all)).toMatchObject({
      outcome: 'family-only',
      family: 'β',
    });
  });

  test('two equal proteins: matched, but a person chooses', () => {
    const twin = protein('c_twin', 'c', sequence('c_ecoli'));
    const found = proposal(chainOf(sequence('c_ecoli')), [...all, twin]);
    expect(found).toMatchObject({ outcome: 'matched', reason: 'several-proteins' });
    expect(found.equallyGood).toEqual(['c_twin']);
  });

  test('two families without a margin: unmatched', () => {
    const stray = protein('c_stray', 'other', changed(sequence('c_ecoli'), 20));
    expect(proposal(chainOf(sequence('c_ecoli')), [cEcoli, stray])).toMatchObject({
      outcome: 'unmatched',
      reason: 'no-margin',
    });
  });

  test.each([
    ['no residue at all', '', 'too-short'],
    ['ten residues', 'MENLNMDLLY', 'too-short'],
    ['poly-alanine', 'A'.repeat(60), 'no-sequence'],
    ['unknown residues', 'X'.repeat(60), 'no-sequence'],
    ['half another protein', `${sequence('c_ecoli')}${'WDWKWHWCWY'.repeat(8)}`, 'too-little-covered'],
    ['something else', 'WDYHCWKYPDHWCKYEWHDPYCWKHEDYWPCHKWDEYHWKCPYDHWEK', 'nothing-near'],
  ])('%s: unmatched, with the reason in words', (_, letters, reason) => {
    const found = proposal(chainOf(letters), all);
    expect(found).toMatchObject({ outcome: 'unmatched', reason });
    expect(found.words.length).toBeGreaterThan(20);
  });

  test('without any candidate a chain is unmatched', () => {
    expect(proposal(chainOf(sequence('c_ecoli')), [])).toMatchObject({ outcome: 'unmatched', best: null });
  });
});

test('identical chains get equal maps, and only the best few of a large family are aligned', () => {
  const many = Array.from({ length: 30 }, (_, index) => protein(`far${index}`, 'c', sequence('c_yeast')));
  const chains = [chainOf(sequence('c_ecoli')), chainOf(sequence('c_ecoli'), { firstNumber: 100 })];
  const [first, second] = matchChains(chains, [...many, cEcoli]);
  expect(first?.maps).toHaveLength(4);
  expect(first?.maps[0]?.proteinId).toBe('c_ecoli');
  const apartFromLabels = (match: typeof first) =>
    match?.maps.map(({ exceptions, ...map }) => ({
      ...map,
      exceptions: exceptions.map(({ label: _, ...exception }) => exception),
    }));
  expect(apartFromLabels(second)).toEqual(apartFromLabels(first));
});
