import type { ChainMap } from '@/shared/contracts/maps';
import {
  countOf,
  decidedWord,
  doubts,
  groupChains,
  mismatchCount,
  runnerUp,
  standingOf,
} from '@/features/maps/chain-groups';

const ring = '01900000-0000-7000-8000-0000000000c1';
const other = '01900000-0000-7000-8000-0000000000c2';
const familyC = '01900000-0000-7000-8000-00000000000c';
const familyA = '01900000-0000-7000-8000-00000000000a';

function chainOf(authorId: string, change: Partial<ChainMap> = {}): ChainMap {
  return {
    chainId: `chain ${authorId}`,
    structureId: 'structure',
    authorId,
    labelIds: [authorId],
    kind: 'protein',
    observedLength: 79,
    declaredLength: 82,
    sequenceKey: 'c of Orvella tarda',
    missingCount: 3,
    firstLabel: '2',
    lastLabel: '80',
    status: 'proposed',
    readiness: 'ready',
    reason: 'fits',
    familyId: familyC,
    proteinId: ring,
    organism: 'Orvella tarda',
    identity: 1,
    coverage: 1,
    proteinLength: 82,
    segments: [{ chainStart: 0, proteinStart: 1, length: 79 }],
    exceptions: [],
    candidates: [],
    decidedBy: null,
    version: 1,
    ...change,
  };
}
const exception = (kind: ChainMap['exceptions'][number]['kind']): ChainMap['exceptions'][number] => ({
  kind,
  label: '61',
  chainLetter: 'Q',
  residueIndex: 60,
  proteinLetter: 'E',
  message: 'Q where the protein has E.',
});

describe('chains are grouped', () => {
  it('puts copies with the same match in one group, in the order of the file', () => {
    const groups = groupChains([chainOf('A'), chainOf('B'), chainOf('C')]);
    expect(groups).toHaveLength(1);
    expect(groups[0]?.names).toBe('A to C');
    expect(groups[0]?.chains.map(({ authorId }) => authorId)).toEqual(['A', 'B', 'C']);
  });

  it.each([
    ['another protein', { proteinId: other }],
    ['another identity', { identity: 0.99 }],
    ['a residue less', { segments: [{ chainStart: 0, proteinStart: 1, length: 78 }] }],
    ['an exception', { exceptions: [exception('mismatch')] }],
    ['a decision', { status: 'confirmed' as const }],
  ])('keeps a chain with %s apart', (_, change) => {
    expect(groupChains([chainOf('A'), chainOf('B', change), chainOf('C')])).toHaveLength(2);
  });

  it('keeps chains together that were decided in different words', () => {
    const groups = groupChains([
      chainOf('A', { status: 'confirmed' }),
      chainOf('B', { status: 'corrected' }),
    ]);
    expect(groups.map(({ names }) => names)).toEqual(['A, B']);
    expect(groups.map(decidedWord)).toEqual(['decided']);
    expect(groupChains([chainOf('A', { status: 'corrected' })]).map(decidedWord)).toEqual(['corrected']);
  });

  it('lists first what needs a person', () => {
    const groups = groupChains([
      chainOf('N', { kind: 'nucleic', status: null, readiness: 'none', proteinId: null }),
      chainOf('D', { status: 'confirmed' }),
      chainOf('R'),
      chainOf('L', { readiness: 'look', exceptions: [exception('mismatch')] }),
      chainOf('X', { readiness: 'choose', proteinId: null, identity: null, coverage: null, segments: [] }),
      chainOf('O', { status: 'left out' }),
    ]);
    expect(groups.map(({ names }) => names)).toEqual(['X', 'L', 'R', 'D', 'O', 'N']);
  });

  it('keeps unmatched chains of equal length and numbers apart when their sequences differ', () => {
    const unmatched = {
      readiness: 'choose',
      proteinId: null,
      identity: null,
      coverage: null,
      segments: [],
    } as const;
    const groups = groupChains([
      chainOf('A', { ...unmatched, segments: [] }),
      chainOf('B', { ...unmatched, segments: [] }),
      chainOf('C', { ...unmatched, segments: [], sequenceKey: 'another' }),
    ]);
    expect(groups.map(({ names }) => names)).toEqual(['A, B', 'C']);
  });

  it('counts chains, not groups', () => {
    const groups = groupChains([chainOf('A'), chainOf('B'), chainOf('C', { identity: 0.99 })]);
    expect(countOf(groups, 'ready')).toBe(3);
    expect(countOf(groups, 'choose')).toBe(0);
  });
});

describe('a chain stands', () => {
  it.each([
    ['ready', chainOf('A')],
    ['look', chainOf('A', { readiness: 'look' })],
    ['choose', chainOf('A', { readiness: 'choose' })],
    ['decided', chainOf('A', { status: 'corrected', readiness: 'look' })],
    ['left out', chainOf('A', { status: 'left out' })],
    ['no protein', chainOf('A', { status: null, readiness: 'none' })],
  ])('%s', (standing, chain) => expect(standingOf(chain)).toBe(standing));
});

describe('what is said of one chain', () => {
  it('does not doubt a tag or a modified residue', () => {
    const chain = chainOf('A', {
      exceptions: [exception('tag'), exception('modified'), exception('mismatch'), exception('ambiguous')],
    });
    expect(doubts(chain).map(({ kind }) => kind)).toEqual(['mismatch', 'ambiguous']);
  });

  it('counts other letters as mismatches, on purpose or not', () => {
    const exceptions = [exception('mismatch'), exception('engineered'), exception('tag')];
    expect(mismatchCount(chainOf('A', { exceptions }))).toBe(2);
  });

  it('names the nearest of another family before a homolog of its own', () => {
    const candidate = (proteinId: string, familyId: string, identity: number) => ({
      proteinId,
      familyId,
      family: familyId === familyC ? 'c' : 'a',
      organism: 'Orvella tarda',
      identity,
      coverage: 1,
    });
    const own = candidate(ring, familyC, 1);
    const homolog = candidate(other, familyC, 0.7);
    const far = candidate('far', familyA, 0.2);
    expect(runnerUp(chainOf('A', { candidates: [own, homolog, far] }))).toBe(far);
    expect(runnerUp(chainOf('A', { candidates: [own, homolog] }))).toBe(homolog);
    expect(runnerUp(chainOf('A', { candidates: [own] }))).toBeNull();
  });
});
