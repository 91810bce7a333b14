/** What a printed label says; family and letter are null where unknown. */
export interface PrintableResidue {
  family: string | null;
  letter: string | null;
  /** Null: the residue has no label in this numbering. */
  label: string | null;
}

const NO_LABEL = '–';

/** As on a plate: `c E59`. */
export function plateLabel({ family, letter, label }: PrintableResidue): string {
  return `${family === null ? '' : `${family} `}${letter ?? ''}${label ?? NO_LABEL}`;
}
