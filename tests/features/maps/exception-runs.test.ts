import type { ChainMap } from '@/shared/contracts/maps';
import { exceptionRuns } from '@/features/maps/exception-runs';

type MapException = ChainMap['exceptions'][number];

const tag = (label: string, chainLetter: string): MapException => ({
  kind: 'tag',
  label,
  chainLetter,
  residueIndex: null,
  proteinLetter: null,
  message: 'Outside the protein.',
});
const mismatch = (label: string, residueIndex: number): MapException => ({
  ...tag(label, 'Q'),
  kind: 'mismatch',
  residueIndex,
  proteinLetter: 'E',
});
const shown = (exceptions: MapException[]) =>
  exceptionRuns(exceptions).map(({ kind, labels, letters }) => [kind, labels, letters]);

describe('exceptions of a chain', () => {
  it('joins a tag into one run', () =>
    expect(shown([tag('-2', 'M'), tag('-1', 'H'), tag('0', 'H'), mismatch('61', 60)])).toEqual([
      ['tag', '-2 to 0', 'MHH'],
      ['mismatch', '61', 'Q'],
    ]));

  it('keeps both ends apart, and what carries an insertion letter', () =>
    expect(shown([tag('1', 'M'), tag('80', 'H'), tag('81', 'H'), tag('81A', 'H')])).toEqual([
      ['tag', '1', 'M'],
      ['tag', '80 to 81', 'HH'],
      ['tag', '81A', 'H'],
    ]));

  it('never joins residues that have a partner', () =>
    expect(shown([mismatch('61', 60), mismatch('62', 61)])).toHaveLength(2));

  it('cuts a long run of letters and says how many are left', () => {
    const long = Array.from({ length: 30 }, (_, at) => tag(String(at + 1), 'G'));
    expect(shown(long)).toEqual([['tag', '1 to 30', `${'G'.repeat(20)} and 10 more`]]);
  });
});
