import { codeOfLetter, nameOfLetter } from '../alphabet';

/** What a printed label says; family and letter are null where unknown. */
export interface PrintableResidue {
  family: string | null;
  letter: string | null;
  /** Null: the residue has no label in this numbering. */
  label: string | null;
  /** One-letter code of a planned change, `*` a stop. */
  mutationTo?: string | null;
}

const NO_LABEL = '–';

/** Compact, as the field writes it: `cE59`, `βK162`, `cE59Q`, `E59`; names of several letters get a hyphen. */
export function compactLabel({ family, letter, label, mutationTo }: PrintableResidue): string {
  const residue = `${letter ?? ''}${label ?? NO_LABEL}${mutationTo ?? ''}`;
  if (family === null || family === '') return residue;
  return `${family}${family.length > 1 || letter === null ? '-' : ''}${residue}`;
}

/** As on a plate: `c E59`. */
export function plateLabel({ family, letter, label, mutationTo }: PrintableResidue): string {
  return `${family === null ? '' : `${family} `}${letter ?? ''}${label ?? NO_LABEL}${mutationTo ?? ''}`;
}

/** With three-letter codes: `c Glu59`, `c Glu59Gln`. */
export function longLabel({ family, letter, label, mutationTo }: PrintableResidue): string {
  const from = letter === null ? '' : codeOfLetter(letter);
  const to = mutationTo === undefined || mutationTo === null ? '' : codeOfLetter(mutationTo);
  return `${family === null ? '' : `${family} `}${from}${label ?? NO_LABEL}${to}`;
}

/** For a screen reader: `c glutamate 59`, `c glutamate 59 to glutamine`. */
export function spokenLabel({ family, letter, label, mutationTo }: PrintableResidue): string {
  const name = letter === null ? 'residue' : nameOfLetter(letter).toLowerCase();
  const to =
    mutationTo === undefined || mutationTo === null ? [] : ['to', nameOfLetter(mutationTo).toLowerCase()];
  return [...(family === null ? [] : [family]), name, label ?? 'without a number', ...to].join(' ');
}
