import type { Passport, Reading } from '@/shared/contracts/residues';
import { columnRows, letterShares } from '@/features/residues/column-rows';
import { groupReadings, onlyReading, reasonsOf } from '@/features/residues/group-readings';
import { passportRows, passportText } from '@/features/residues/passport-text';

const id = (number: number) => `01a2320f-b4b6-7638-92fa-${String(number).padStart(12, '0')}`;
const residue = (over: object = {}) => ({
  proteinId: id(1),
  residueIndex: 61,
  familyId: id(2),
  family: 'c',
  part: 'rotor' as const,
  organism: 'Orvella tarda',
  letter: 'E',
  label: '62',
  numbering: 'mature',
  ...over,
});
const reading = (over: Partial<Reading> = {}): Reading => ({
  residue: residue(),
  group: 'Family c, residue 62',
  spelling: 'c_62',
  reason: 'c is family c',
  mismatch: null,
  mutationTo: null,
  pinCount: 0,
  ...over,
});

describe('the readings of an address', () => {
  it('say once what all under a heading are read by, and each what is its own', () => {
    const [group] = groupReadings([
      reading({ reason: 'mature; c is family c' }),
      reading({ reason: 'sequence 62 is mature 61; c is family c' }),
    ]);
    const [alone] = groupReadings([reading({ reason: 'mature; c is family c' })]);
    expect([group && reasonsOf(group), alone && reasonsOf(alone)]).toEqual([
      { shared: 'c is family c', own: ['', 'sequence 62 is mature 61'] },
      { shared: '', own: ['c is family c'] },
    ]);
  });

  it('keep the order they were ranked in, each under its heading', () => {
    const list = [reading(), reading(), reading({ group: 'Amino acid Cys' }), reading({ mismatch: 'says' })];
    const groups = groupReadings(list);
    expect(groups.map(({ title }) => title)).toEqual([
      'Family c, residue 62',
      'Amino acid Cys',
      'Family c, residue 62',
    ]);
    expect(groups.flatMap(({ readings }) => readings.map(({ at }) => at))).toEqual([0, 1, 2, 3]);
  });

  it('open without choosing only when there is one, and its letter stands there', () => {
    expect(onlyReading({ readings: [reading()], more: false })).not.toBeNull();
    expect(onlyReading({ readings: [reading(), reading()], more: false })).toBeNull();
    expect(onlyReading({ readings: [reading()], more: true })).toBeNull();
    expect(onlyReading({ readings: [reading({ mismatch: 'says Glu, is Asp' })], more: false })).toBeNull();
    expect(onlyReading({ readings: [], more: false })).toBeNull();
  });
});

const passport: Passport = {
  residue: residue(),
  proteinName: 'c',
  proteinLength: 83,
  familyVersion: 1,
  labels: [
    { numbering: 'sequence', kind: 'sequence', preferred: false, label: '70' },
    { numbering: 'mature', kind: 'offset', preferred: true, label: '62' },
    { numbering: 'tagged', kind: 'offset', preferred: false, label: null },
  ],
  column: {
    alignmentId: id(3),
    alignmentName: 'c, ten organisms',
    revision: 4,
    column: 70,
    rowCount: 5,
    gapCount: 1,
    shares: [
      { letter: 'E', count: 2, organisms: ['Orvella tarda', 'Salivena maris'] },
      { letter: 'D', count: 1, organisms: ['Cryorota nivalis'] },
    ],
  },
  equivalents: [
    { ...residue({ proteinId: id(5), letter: 'D', label: '66' }), grade: 'good', letterRelation: 'similar' },
  ],
  gaps: [{ proteinId: id(6), organism: '', rowName: 'row 9' }],
  copies: [
    {
      structureId: id(7),
      structureName: 'R12',
      chainId: id(8),
      authorId: 'K',
      label: '62',
      letter: 'E',
      state: 'observed',
      confirmed: true,
      engineered: false,
    },
  ],
  previous: null,
  next: null,
  pinnedIndices: [],
};

describe('a passport', () => {
  it('names the preferred numbering first, what has no label, and the column counted from one', () => {
    expect(passportRows(passport).map(({ name, value }) => `${name}: ${value}`)).toEqual([
      'mature, preferred: Glu62',
      'sequence: Glu70',
      'tagged: no label',
      'alignment c, ten organisms, revision 4: column 71',
    ]);
  });

  it('as text gives every number its numbering, and calls equivalents by their grade', () => {
    const lines = passportText(passport).split('\n');
    expect(lines[0]).toBe('c E62, glutamate, mature numbering, Orvella tarda');
    expect(lines).toContain('R12, chain K: author number 62');
    expect(lines).toContain('by equivalence, grade good: c D66, mature numbering, Orvella tarda');
  });

  it('shares the counted rows over the letters and gaps, so that they make one', () => {
    const { shares, rowCount } = letterShares(passport.column as NonNullable<Passport['column']>);
    expect(rowCount).toBe(4);
    expect(shares.map(({ letter, rowCount: count }) => [letter, count])).toEqual([
      ['E', 2],
      ['D', 1],
      ['-', 1],
    ]);
    expect(shares.reduce((sum, { share }) => sum + share, 0)).toBeCloseTo(1, 12);
  });

  it('lists its own row first and rows with a gap last, by row name where no organism is known', () => {
    expect(columnRows(passport).map(({ kind, organism }) => [kind, organism])).toEqual([
      ['own', 'Orvella tarda'],
      ['equivalent', 'Orvella tarda'],
      ['gap', 'row 9'],
    ]);
  });
});
