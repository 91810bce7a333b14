import { codeOfLetter, letterOfCode, STANDARD_LETTERS } from '../alphabet';
import type { Issue, ParseResult } from '../parse-result';

/** One exchange as a person wrote it, letters settled, the label still as written. */
export interface Substitution {
  /** In its short form, e.g. `E62Q`. */
  short: string;
  from: string;
  label: string;
  to: string;
}

/** One mutant: one or several exchanges made together. */
export interface MutantRequest {
  /** As written. */
  asked: string;
  substitutions: Substitution[];
}

export interface MutationLimits {
  maxMutants: number;
  maxTogether: number;
}
export const MUTATION_LIMITS: MutationLimits = { maxMutants: 2_000, maxTogether: 10 };

const RESIDUE = '[A-Za-z]{3}|[A-Za-z]';
const SUBSTITUTION = new RegExp(`^(${RESIDUE})(-?\\d{1,6}[A-Za-z]??)(${RESIDUE})$`);
/** Kinds of change with a settled notation that are not planned yet. */
const NOT_YET: ReadonlyArray<{ pattern: RegExp; what: string }> = [
  { pattern: /fs(\*|Ter)?\d*$/i, what: 'a frameshift' },
  { pattern: /delins/i, what: 'a deletion with insertion' },
  { pattern: /del$/i, what: 'a deletion' },
  { pattern: /(ins[A-Za-z]*)$/i, what: 'an insertion' },
  { pattern: /dup$/i, what: 'a duplication' },
  { pattern: /=$/, what: 'a silent change' },
  { pattern: /\d[A-Za-z]?(\*|Ter|Stop)$/i, what: 'a change to a stop' },
  { pattern: /\d(X|Xaa)$/i, what: 'a degenerate codon' },
  { pattern: /^[pc]\./, what: 'the HGVS form, which counts from the precursor' },
];

function shown(text: string): string {
  return text.length > 30 ? `${text.slice(0, 30)}…` : text;
}

function standardLetter(text: string): string | null {
  const letter = text.length === 1 ? text.toUpperCase() : letterOfCode(text);
  return letter !== undefined && STANDARD_LETTERS.includes(letter) ? letter : null;
}

/** The word without the family it begins with, `cE62Q` or `c-E62Q`: only where it is no exchange as it stands. */
function withoutFamily(text: string, families: readonly string[]): string {
  if (SUBSTITUTION.test(text)) return text;
  const longestFirst = [...families].sort((one, other) => other.length - one.length);
  const family = longestFirst.find((name) => text.startsWith(name));
  return family === undefined ? text : text.slice(family.length).replace(/^[-_ .]/, '');
}

function parseOne(text: string): Substitution | Issue {
  const issue = (code: string, message: string): Issue => ({ code, severity: 'error', message });
  const kind = NOT_YET.find(({ pattern }) => pattern.test(text));
  if (kind)
    return issue(
      'mutation-not-yet',
      `"${shown(text)}" asks for ${kind.what}; so far only exchanges such as E62Q are planned.`,
    );
  const parts = SUBSTITUTION.exec(text);
  if (!parts)
    return issue(
      'mutation-unreadable',
      `"${shown(text)}" is no exchange; write the old residue, its number and the new one, such as E62Q or Glu62Gln.`,
    );
  const [, old = '', label = '', next = ''] = parts;
  const from = standardLetter(old);
  const to = standardLetter(next);
  if (from === null || to === null)
    return issue(
      'mutation-unknown-residue',
      `"${from === null ? old : next}" in "${shown(text)}" is none of the 20 amino acids.`,
    );
  if (from === to)
    return issue('mutation-without-change', `"${shown(text)}" leaves ${codeOfLetter(from)} as it is.`);
  return { short: `${from}${label}${to}`, from, label, to };
}

/**
 * Reads mutants as people write them: `E62Q`, `Glu62Gln`; exchanges made together joined by `+` or `/`, mutants apart by comma,
 * semicolon or line. Labels are text (`52A`, `-4`), in whatever numbering the caller looks them up. `families` are the names by
 * which the protein's family may stand in front, as on a plate: `cE62Q`.
 *
 * Errors: `mutation-empty`, `mutation-unreadable`, `mutation-unknown-residue`, `mutation-without-change`, `mutation-not-yet`,
 * `mutation-twice` (one place named twice in one mutant), `too-many-mutations`. Columns from 1 in the text.
 */
export function parseMutations(
  text: string,
  limits: Partial<MutationLimits> = {},
  families: readonly string[] = [],
): ParseResult<MutantRequest[]> {
  const { maxMutants, maxTogether } = { ...MUTATION_LIMITS, ...limits };
  const issues: Issue[] = [];
  const mutants: MutantRequest[] = [];
  const fail = (code: string, message: string): ParseResult<MutantRequest[]> => ({
    value: null,
    issues: [{ code, severity: 'error', message }],
  });
  let offset = 0;
  const pieces = text.split(/[,;\n]/);
  if (text.trim() === '') return fail('mutation-empty', 'No mutation is named; write one such as E62Q.');
  if (pieces.length > maxMutants)
    return fail('too-many-mutations', `${pieces.length} mutants; at most ${maxMutants} at once.`);
  for (const piece of pieces) {
    const asked = piece.trim();
    const column = offset + piece.length - piece.trimStart().length + 1;
    offset += piece.length + 1;
    if (asked === '') continue;
    const words = asked.split(/[+/]/).map((word) => word.trim());
    if (words.length > maxTogether)
      return fail('too-many-mutations', `${words.length} changes in one mutant; at most ${maxTogether}.`);
    const substitutions: Substitution[] = [];
    for (const word of words) {
      const parsed = parseOne(withoutFamily(word, families));
      if ('severity' in parsed) issues.push({ ...parsed, column });
      else if (substitutions.some(({ label }) => label === parsed.label))
        issues.push({
          code: 'mutation-twice',
          severity: 'error',
          column,
          message: `"${shown(asked)}" changes ${parsed.label} twice.`,
        });
      else substitutions.push(parsed);
    }
    mutants.push({ asked, substitutions });
  }
  if (mutants.length === 0) return fail('mutation-empty', 'No mutation is named; write one such as E62Q.');
  return { value: issues.length > 0 ? null : mutants, issues };
}
