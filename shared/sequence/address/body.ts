import { aminoAcid, isAmbiguous, letterOfCode } from '../alphabet';

/** An amino acid and a number, or a number, as it stands behind a family or alone. */
export interface AddressBody {
  letter: string | null;
  label: string;
  mutationTo: string | null;
  /** `insertion` and `change` are the two readings of a letter behind a number. */
  tail: 'none' | 'insertion' | 'change';
  /** The sign was read as a separator, or as a minus. */
  sign: 'none' | 'separator' | 'minus';
}

const NUMBER = '\\d{1,5}';
const BODY = new RegExp(`^([A-Za-z]{0,3})(-?)(${NUMBER})([A-Za-z*]{0,4})$`);
const LITERAL = new RegExp(`^([A-Za-z]{3})?#(-?)(${NUMBER})([A-Za-z]?)([A-Za-z]{3})?$`);
/** Negative labels are short (tags, transit ends); `a-210` is 210 behind a hyphen. */
const MAX_NEGATIVE_DIGITS = 2;

/** One-letter code of a one- or three-letter amino acid, `*` for a stop; null when it is none. */
function residueLetter(text: string): string | null {
  if (text === '*' || text.toLowerCase() === 'ter') return '*';
  if (text.length === 1) return aminoAcid(text)?.letter ?? null;
  return text.length === 3 ? (letterOfCode(text) ?? null) : null;
}

/** What may stand before a number: a definite amino acid. */
function statedLetter(text: string): string | null {
  const letter = residueLetter(text);
  return letter === null || letter === '*' || isAmbiguous(letter) ? null : letter;
}

/** What may stand behind it: a definite amino acid, a stop, or X for any. */
function changedLetter(text: string): string | null {
  const letter = residueLetter(text);
  return letter === null || letter === '*' || letter === 'X' || !isAmbiguous(letter) ? letter : null;
}

/** What may follow a number: nothing, an insertion letter, a new amino acid, or both. */
function readTails(
  tail: string,
  hasLetter: boolean,
): { suffix: string; mutationTo: string | null; tail: AddressBody['tail'] }[] {
  if (tail === '') return [{ suffix: '', mutationTo: null, tail: 'none' }];
  const found: { suffix: string; mutationTo: string | null; tail: AddressBody['tail'] }[] = [];
  const whole = changedLetter(tail);
  // Behind a stated amino acid one letter is a change (E59Q); behind a bare number it may be either.
  const isInsertion = tail.length === 1 && tail !== '*' && (!hasLetter || whole === null);
  if (isInsertion) found.push({ suffix: tail, mutationTo: null, tail: 'insertion' });
  if (whole !== null) found.push({ suffix: '', mutationTo: whole, tail: 'change' });
  const behind = changedLetter(tail.slice(1));
  if (/^[A-Za-z]./.test(tail) && whole === null && behind !== null)
    found.push({ suffix: tail.charAt(0), mutationTo: behind, tail: 'change' });
  return found;
}

/** All readings of a body; behind `#` stands a label exactly as written. Empty when the text is none. */
export function readBodies(text: string): AddressBody[] {
  const literal = LITERAL.exec(text);
  if (literal !== null) {
    const acid = literal[1] ?? '';
    const letter = statedLetter(acid);
    if (acid !== '' && letter === null) return [];
    const label = `${literal[2] ?? ''}${Number(literal[3])}${literal[4] ?? ''}`;
    const mutationTo = changedLetter(literal[5] ?? '');
    if (literal[5] !== undefined && mutationTo === null) return [];
    return [{ letter, label, mutationTo, tail: mutationTo === null ? 'none' : 'change', sign: 'none' }];
  }
  const match = BODY.exec(text);
  if (match === null) return [];
  const [, acid = '', sign = '', digits = '', tail = ''] = match;
  const letter = statedLetter(acid);
  if (acid !== '' && letter === null) return [];
  const number = String(Number(digits));
  const signs: AddressBody['sign'][] = [];
  if (sign === '') signs.push('none');
  else {
    // Papers write Glu-59 with a hyphen; behind one letter or nothing the sign is a minus.
    if (acid.length === 3) signs.push('separator');
    if (acid === '' || digits.length <= MAX_NEGATIVE_DIGITS) signs.push('minus');
  }
  return signs.flatMap((kind) =>
    readTails(tail, letter !== null).map(({ suffix, mutationTo, tail: tailKind }) => ({
      letter,
      label: `${kind === 'minus' && number !== '0' ? '-' : ''}${number}${suffix}`,
      mutationTo,
      tail: tailKind,
      sign: kind,
    })),
  );
}

/** Whether a number is so short that a hyphen before it could be a minus. */
export function mayBeNegative(label: string): boolean {
  return label.replace(/[^0-9]/g, '').length <= MAX_NEGATIVE_DIGITS;
}
