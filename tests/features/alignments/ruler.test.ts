import { rulerText } from '@/features/alignments/ruler';

describe('the ruler over an alignment', () => {
  it('ends each tenth number above its column', () => {
    const text = rulerText(107);
    expect(text).toHaveLength(107);
    expect(text.slice(8, 10)).toBe('10');
    expect(text.slice(97, 100)).toBe('100');
    expect(text.slice(100).trim()).toBe('');
  });

  it('has no number before the tenth column', () => expect(rulerText(9)).toBe(' '.repeat(9)));
});
