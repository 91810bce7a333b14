import { joinTexts } from '@/features/annotations/join-texts';
import { diffWords } from '@/features/annotations/words-diff';

describe('joining two texts that come from one', () => {
  const base = 'Loses its proton in copy 1. Seen in model R12.';

  it('takes both changes where they stand apart', () => {
    const mine = 'Loses its proton in copy 1 and copy 10. Seen in model R12.';
    const theirs = 'Loses its proton in copy 1. Seen in model R12, revision 2.';
    expect(joinTexts(base, mine, theirs)).toEqual({
      text: 'Loses its proton in copy 1 and copy 10. Seen in model R12, revision 2.',
      bothChanged: 0,
    });
  });

  it('keeps both words where both changed the same place, and says so', () => {
    const joined = joinTexts(base, base.replace('1.', '2.'), base.replace('1.', '3.'));
    expect(joined.bothChanged).toBe(1);
    expect(joined.text).toBe('Loses its proton in copy 2 3. Seen in model R12.');
  });

  it('is the other text where one changed nothing, and once where both wrote the same', () => {
    const changed = 'Gains its proton in copy 3.';
    expect(joinTexts(base, base, changed).text).toBe(changed);
    expect(joinTexts(base, changed, base).text).toBe(changed);
    expect(joinTexts(base, changed, changed)).toEqual({ text: changed, bothChanged: 0 });
  });

  it('loses no word that somebody put in, whatever the texts', () => {
    const words = ['a', 'b', 'c', 'd', 'e'];
    let seed = 7;
    const next = (below: number) => (seed = (seed * 1103515245 + 12345) % 2147483648) % below;
    const text = () => Array.from({ length: 1 + next(8) }, () => words[next(5)]).join(' ');
    for (let round = 0; round < 300; round += 1) {
      const [from, mine, theirs] = [text(), `${text()} mine`, `${text()} theirs`];
      const joined = joinTexts(from, mine, theirs).text;
      expect(joined).toContain('mine');
      expect(joined).toContain('theirs');
    }
  });
});

describe('telling two texts apart', () => {
  it('gives the old text without what was put in, and the new one without what was taken out', () => {
    const before = 'The proton waits on E62, then R210 comes.';
    const after = 'The proton waits long on E62; R210 comes near.';
    const pieces = diffWords(before, after);
    const side = (left: 'out' | 'in') =>
      pieces.flatMap(({ kind, text }) => (kind === 'same' || kind === left ? [text] : [])).join('');
    expect(side('out')).toBe(before);
    expect(side('in')).toBe(after);
    expect(pieces.filter(({ kind }) => kind === 'in').map(({ text }) => text.trim())).toContain('long');
  });
});
