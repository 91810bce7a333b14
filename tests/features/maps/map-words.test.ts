import { chainNames } from '@/features/maps/chain-names';
import { authorShift, percentWords, shiftWords, stretchWords } from '@/features/maps/map-words';
import { preferredLabel } from '@/features/maps/preferred-label';

describe('chains are named', () => {
  it.each([
    [['A'], 'A'],
    [['A', 'B'], 'A, B'],
    [['A', 'B', 'C', 'D', 'E', 'F', 'G', 'H', 'I'], 'A to I'],
    [['K', 'L', 'M', 'N', 'P', 'Q'], 'K to N, P, Q'],
    [['a', 'b', 'c', '1', '2', '3'], 'a to c, 1 to 3'],
    [['Z', 'a', 'b'], 'Z, a, b'],
    [['9', ':', ';'], '9, :, ;'],
    [['AA', 'AB', 'AC'], 'AA, AB, AC'],
  ])('%j is %s', (ids, words) => expect(chainNames(ids)).toBe(words));
});

describe('a share', () => {
  it.each([
    [1, '100\u00a0%'],
    [0.9999, '99.9\u00a0%'],
    [0.9868, '98.7\u00a0%'],
    [0, '0\u00a0%'],
  ])('%f reads %s', (fraction, words) => expect(percentWords(fraction)).toBe(words));
});

describe('author numbers beside places in the sequence', () => {
  const whole = (proteinStart: number, firstLabel: string, lastLabel: string) => ({
    segments: [{ chainStart: 0, proteinStart, length: 79 }],
    observedLength: 79,
    firstLabel,
    lastLabel,
  });

  it('are equal', () => {
    expect(authorShift(whole(1, '2', '80'))).toBe(0);
    expect(shiftWords(0)).toBe('equals the place in the sequence');
  });

  it('are shifted, up or down', () => {
    expect(authorShift(whole(43, '1', '79'))).toBe(-43);
    expect(shiftWords(-43)).toBe('place in the sequence minus 43');
    expect(shiftWords(50)).toBe('place in the sequence plus 50');
  });

  it('have no one shift when the ends differ, carry letters, or lie outside the protein', () => {
    expect(authorShift(whole(1, '2', '81'))).toBeNull();
    expect(authorShift(whole(1, '2A', '80'))).toBeNull();
    expect(authorShift({ ...whole(1, '2', '80'), observedLength: 85 })).toBeNull();
    expect(authorShift({ ...whole(1, '2', '80'), segments: [] })).toBeNull();
  });
});

describe('the stretch of the protein', () => {
  it('says both ends, counted from 1, and its gaps', () => {
    const segments = [
      { chainStart: 0, proteinStart: 1, length: 10 },
      { chainStart: 12, proteinStart: 11, length: 10 },
      { chainStart: 22, proteinStart: 30, length: 10 },
    ];
    expect(stretchWords(segments, 82)).toBe('2 to 40 of 82, 1 gap');
    expect(stretchWords(segments.slice(0, 1), 82)).toBe('2 to 11 of 82');
    expect(stretchWords([], 82)).toBe('nothing');
  });
});

describe('the label shown first', () => {
  const protein = {
    preferredNumbering: 'mature',
    numberings: [
      { id: '1', name: 'sequence', kind: 'sequence' as const, segments: [run(0, 100, 1)] },
      { id: '2', name: 'mature', kind: 'offset' as const, segments: [run(50, 50, 1)] },
    ],
  };
  function run(residueIndex: number, length: number, firstNumber: number) {
    return { residueIndex, length, firstNumber, suffix: '' };
  }

  it('is that of the preferred numbering', () =>
    expect(preferredLabel(protein, 58)).toEqual({ label: '9', numbering: 'mature' }));
  it('is none where that numbering gives none', () => expect(preferredLabel(protein, 49)).toBeNull());
});
