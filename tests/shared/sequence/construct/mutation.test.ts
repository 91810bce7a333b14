import fc from 'fast-check';
import { checkMutant } from '@/shared/sequence/construct/mutation-check';
import { parseMutations } from '@/shared/sequence/construct/mutation';
import { offsetNumbering, sequenceNumbering, type Numbering } from '@/shared/sequence/numbering/numbering';
import { residueIndex } from '@/shared/sequence/positions';

const codes = (text: string) => parseMutations(text).issues.map(({ code }) => code);
const shorts = (text: string) =>
  parseMutations(text).value?.map(({ substitutions }) => substitutions.map(({ short }) => short));

test('one letter, three letters and lower case say the same', () => {
  expect(shorts('E62Q')).toEqual([['E62Q']]);
  expect(shorts('Glu62Gln')).toEqual([['E62Q']]);
  expect(shorts('glu62GLN')).toEqual([['E62Q']]);
  expect(shorts('e62q')).toEqual([['E62Q']]);
});

test('plus joins changes of one mutant, comma, semicolon and line part mutants', () => {
  expect(shorts('E59Q+R210A, D61N;A24G\nI28E/D61N')).toEqual([
    ['E59Q', 'R210A'],
    ['D61N'],
    ['A24G'],
    ['I28E', 'D61N'],
  ]);
});

test('labels are text: insertion letters and negative numbers', () => {
  expect(
    parseMutations('E52AQ, M-4K, Gly219aAla').value?.map(({ substitutions: [first] }) => [
      first?.from,
      first?.label,
      first?.to,
    ]),
  ).toEqual([
    ['E', '52A', 'Q'],
    ['M', '-4', 'K'],
    ['G', '219a', 'A'],
  ]);
  expect(shorts('E62Ala')).toEqual([['E62A']]);
});

test.each([
  'Q42del',
  'Q42_D44del',
  'K43_N44insGS',
  'D61_A62delinsNG',
  'G23_A25dup',
  'R97fs',
  'W26*',
  'W26Ter',
  'D61=',
  'D61X',
  'p.Asp61Asn',
])('%s is known, and not yet planned', (text) => expect(codes(text)).toEqual(['mutation-not-yet']));

test('what cannot be read is told with its column', () => {
  expect(parseMutations('E62Q, banana').issues[0]).toMatchObject({ code: 'mutation-unreadable', column: 7 });
  expect(codes('B62Q')).toEqual(['mutation-unknown-residue']);
  expect(codes('Foo62Gln')).toEqual(['mutation-unknown-residue']);
  expect(codes('E62E')).toEqual(['mutation-without-change']);
  expect(codes('E62Q+E62K')).toEqual(['mutation-twice']);
  expect(codes('')).toEqual(['mutation-empty']);
  expect(codes(' , ,')).toEqual(['mutation-empty']);
  expect(parseMutations('E62Q,E63Q', { maxMutants: 1 }).issues[0]?.code).toBe('too-many-mutations');
  expect(new Set(codes('<b>E62Q</b>'))).toEqual(new Set(['mutation-unreadable']));
  expect(parseMutations('x'.repeat(10_000)).issues[0]?.message.length).toBeLessThan(200);
});

test('any text gives mutants or an error, never an exception', () => {
  const soup = fc.string({ unit: fc.constantFrom(...'EDQN0123456789+,-/ *delinsfp.GluAsp') });
  fc.assert(
    fc.property(fc.oneof(soup, fc.string()), (text) => {
      const { value, issues } = parseMutations(text);
      expect(value === null).toBe(issues.length > 0);
    }),
  );
});

describe('held against a protein', () => {
  //               1234567890
  const PROTEIN = 'MAGDLLEIPM';
  const check = (text: string, numbering: Numbering = sequenceNumbering(PROTEIN.length)) => {
    const [request] = parseMutations(text).value ?? [];
    if (!request) throw new Error(`${text} cannot be read`);
    return checkMutant(request, PROTEIN, numbering);
  };

  test('a letter that stands there gives the residue index', () => {
    expect(check('E7Q').value?.changes).toEqual([{ residueIndex: 6, label: '7', from: 'E', to: 'Q' }]);
    expect(check('E57Q', offsetNumbering(PROTEIN.length, 50)).value?.changes[0]?.residueIndex).toBe(6);
  });

  test('D7N where E stands: what stands there, and where the nearest D is', () => {
    const { value, issues, suggestions } = check('D7N');
    expect(value).toBeNull();
    expect(issues[0]).toMatchObject({ code: 'mutation-letter-differs', severity: 'error', residue: '7' });
    expect(issues[0]?.message).toBe('D7N: at 7 stands Glu (E), not Asp (D). The nearest D stands at 4.');
    expect(suggestions).toEqual(['D4N']);
  });

  test('the nearest places come first, in the numbering that was asked in', () => {
    const { suggestions } = check('M54K', offsetNumbering(PROTEIN.length, 50));
    expect(suggestions).toEqual(['M51K', 'M60K']);
  });

  test('a letter that is nowhere near', () => {
    expect(check('W7A').issues[0]?.message).toContain('No W stands within 20 residues');
  });

  test('a label outside the protein, or without a residue', () => {
    expect(check('E11Q').issues[0]).toMatchObject({ code: 'mutation-label-unknown', residue: '11' });
    expect(check('E11Q').issues[0]?.message).toContain('from 1 to 10');
    expect(check('E0Q').issues[0]?.code).toBe('mutation-label-unknown');
    const silent: Numbering = { segments: [] };
    expect(check('E7Q', silent).issues[0]?.code).toBe('mutation-label-unknown');
  });

  test('labels come from the numbering alone', () => {
    const lettered: Numbering = {
      segments: [{ residueIndex: residueIndex(6), length: 1, firstNumber: 52, suffix: 'A' }],
    };
    expect(check('E52AQ', lettered).value?.changes[0]).toMatchObject({ residueIndex: 6, label: '52A' });
  });

  test('the first residue is allowed with a warning', () => {
    const { value, issues } = check('M1K');
    expect(value).not.toBeNull();
    expect(issues.map(({ code, severity }) => [code, severity])).toEqual([
      ['mutation-start-codon', 'warning'],
    ]);
  });
});

test.each([
  ['cE62Q', ['c'], 'E62Q'],
  ['c-E62Q', ['c'], 'E62Q'],
  ['c E62Q + cR41K', ['c'], 'E62Q+R41K'],
  ['βK173A', ['β', 'beta'], 'K173A'],
  ['betaLys173Ala', ['β', 'beta'], 'K173A'],
])('the family may stand in front, as on a plate: %s', (text, families, short) => {
  const read = parseMutations(text, {}, families).value?.[0]?.substitutions.map((one) => one.short);
  expect(read?.join('+')).toBe(short);
});

test('another family in front, or one that would eat the old residue, is not taken off', () => {
  expect(parseMutations('bK173A', {}, ['β', 'beta']).issues[0]?.code).toBe('mutation-unreadable');
  expect(parseMutations('A62G', {}, ['A']).value?.[0]?.substitutions[0]).toMatchObject({
    from: 'A',
    to: 'G',
  });
});
