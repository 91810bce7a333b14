import { normalizeAddressText } from './normalize-text';
import type { AddressFamily } from './types';

const GREEK: Readonly<Record<string, string>> = {
  alpha: 'α',
  beta: 'β',
  gamma: 'γ',
  delta: 'δ',
  epsilon: 'ε',
  zeta: 'ζ',
};
const WORD_OF_GREEK = new Map(Object.entries(GREEK).map(([word, letter]) => [letter, word]));
/** A Latin letter typed for a Greek one it resembles. α is never meant by a bare a: both are subunits. */
const LOOKALIKES: Readonly<Record<string, string>> = { b: 'β', E: 'ε', e: 'ε' };

/** How the beginning of a text names a family. */
export interface FamilyMatch {
  family: AddressFamily;
  /** The typed characters that name it. */
  typed: string;
  how: 'exact' | 'other-case' | 'lookalike';
}

/** Everything a family may be written as: name, aliases, and the Greek letter or word of each. */
export function formsOf(family: AddressFamily): string[] {
  const forms = [family.name, ...family.aliases].map(normalizeAddressText).filter((form) => form !== '');
  const twins = forms.flatMap((form) => [GREEK[form.toLowerCase()], WORD_OF_GREEK.get(form)]);
  return [...new Set([...forms, ...twins.filter((twin) => twin !== undefined)])];
}

/** Case counts in one and two letters (E and e are different subunits), not in words. */
const caseCounts = (form: string) => form.length <= 2;

function matchForm(text: string, form: string): FamilyMatch['how'] | null {
  const typed = text.slice(0, form.length);
  if (typed === form) return 'exact';
  if (typed.toLowerCase() !== form.toLowerCase()) return null;
  return caseCounts(form) ? 'other-case' : 'exact';
}

/** All ways the text may begin with a family: exact ones first, longest first. */
export function familiesAtStart(text: string, families: readonly AddressFamily[]): FamilyMatch[] {
  const rank = { exact: 0, 'other-case': 1, lookalike: 2 };
  const found: FamilyMatch[] = [];
  for (const family of families) {
    for (const form of formsOf(family)) {
      const how = matchForm(text, form);
      if (how !== null) found.push({ family, typed: text.slice(0, form.length), how });
      const first = text.charAt(0);
      if (LOOKALIKES[first] === form) found.push({ family, typed: first, how: 'lookalike' });
    }
  }
  found.sort((a, b) => rank[a.how] - rank[b.how] || b.typed.length - a.typed.length);
  return found.filter(
    (match, index) =>
      found.findIndex((other) => other.family === match.family && other.typed === match.typed) === index,
  );
}
