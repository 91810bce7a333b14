import { shortLabel, spokenResidue, wordsForCode } from '@/components/residue/residue-words';

const residue = { family: 'c', code: 'E', number: '59', numbering: 'mature', organism: 'Orvella tarda' };

test('a residue reads as family, name and number, numbering, organism', () => {
  expect(spokenResidue(residue)).toBe('c, glutamate 59, mature numbering, Orvella tarda');
});

test('what is not observed says so, and how good it is; observed says nothing more', () => {
  expect(spokenResidue({ ...residue, code: 'D', number: '61', evidence: 'equivalence', grade: 'good' })).toBe(
    'c, aspartate 61, mature numbering, Orvella tarda, by equivalence, grade good',
  );
  expect(spokenResidue({ ...residue, evidence: 'observed' })).toBe(spokenResidue(residue));
  expect(spokenResidue({ family: 'c', code: 'V', number: '58', struck: true })).toBe(
    'c, valine 58, not in this revision',
  );
});

test('a planned change is written E59Q and read "to glutamine"', () => {
  expect(shortLabel({ ...residue, becomes: 'Q' })).toBe('E59Q');
  expect(spokenResidue({ family: 'c', code: 'E', number: '59', becomes: 'Q' })).toBe(
    'c, glutamate 59 to glutamine',
  );
});

test('labels stay what people read: insertion codes and negative numbers', () => {
  expect(shortLabel({ code: 'G', number: '52A' })).toBe('G52A');
  expect(shortLabel({ code: 'H', number: '-3' })).toBe('H-3');
});

test('a letter without a name is read as it stands', () => {
  expect(wordsForCode('*').name).toBe('residue *');
});

// IUPAC-IUB Joint Commission on Biochemical Nomenclature, recommendations 1983: the twenty, in both codes.
test('the twenty letters carry the published three-letter codes', () => {
  const published =
    'A Ala R Arg N Asn D Asp C Cys Q Gln E Glu G Gly H His I Ile L Leu K Lys M Met F Phe P Pro S Ser T Thr W Trp Y Tyr V Val'.split(
      ' ',
    );
  for (let at = 0; at < published.length; at += 2) {
    expect(wordsForCode(published[at] ?? '').threeLetter).toBe(published[at + 1]);
  }
});

// The product's eight classes of side chains; each of the twenty belongs to one.
test('each of the twenty has its class of chemistry', () => {
  const classes: Record<string, string> = {
    acidic: 'DE',
    basic: 'RHK',
    polar: 'NQST',
    aliphatic: 'AILMV',
    aromatic: 'FWY',
    glycine: 'G',
    proline: 'P',
    cysteine: 'C',
  };
  for (const [chemistry, letters] of Object.entries(classes)) {
    for (const letter of letters)
      expect([letter, wordsForCode(letter).chemistry]).toEqual([letter, chemistry]);
  }
});
