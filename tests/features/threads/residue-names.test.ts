import { cutAtNames, residueNamePattern } from '@/features/threads/residue-names';

const families = [
  { name: 'c', aliases: ['ring'] },
  { name: 'a', aliases: [] },
  { name: 'β', aliases: ['beta'] },
  { name: 'OSCP', aliases: [] },
];
const pattern = residueNamePattern(families) as RegExp;
const namesIn = (text: string) =>
  cutAtNames(text, families, pattern).flatMap((part) =>
    typeof part === 'string' ? [] : [`${part.family} ${part.letter}${part.label}${part.mutationTo ?? ''}`],
  );
const textOf = (text: string) =>
  cutAtNames(text, families, pattern)
    .map((part) => (typeof part === 'string' ? part : part.text))
    .join('');

describe('residue names in what people write', () => {
  it.each([
    ['The proton waits on cE62 until aR210 comes.', ['c E62', 'a R210']],
    ['βK162 and betaK162 are the same.', ['β K162', 'β K162']],
    ['Make cE62Q, then c-E62D.', ['c E62Q', 'c E62D']],
    ['cGlu62 in words, cGlu62Gln changed', ['c E62', 'c E62Q']],
    ['OSCP-K20 holds on', ['OSCP K20']],
  ])('are found in "%s"', (text, names) => {
    expect(namesIn(text)).toEqual(names);
  });

  it.each([
    'E62 alone names no family',
    'chain K:59 is no family',
    'a K200 mutant, where a is a word',
    'the residues c62 and a210 could be many',
    'myocE62 and cE62x are other words',
    'version a-1.5 and pH 7',
    'http://example.org/cE62',
  ])('are not guessed in "%s"', (text) => {
    expect(namesIn(text)).toEqual([]);
  });

  it('leaves every character where it was', () => {
    for (const text of ['cE62', '', 'x cE62 y aR210', 'cE62aR210', 'βK162.']) expect(textOf(text)).toBe(text);
  });

  it('finds nothing to look for in a project without families', () => {
    expect(residueNamePattern([])).toBeNull();
  });
});
