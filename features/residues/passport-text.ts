import type { Passport } from '@/shared/contracts/residues';
import { wordsForCode } from '@/components/residue/residue-words';

export interface PassportRow {
  name: string;
  value: string;
  preferred: boolean;
}

/** What a residue is called, a row each: numberings, the preferred one first, then its alignment column. */
export function passportRows({ residue, labels, column }: Passport): PassportRow[] {
  const code = wordsForCode(residue.letter).threeLetter;
  const inOrder = [...labels].sort((one, other) => Number(other.preferred) - Number(one.preferred));
  const rows = inOrder.map(({ numbering, preferred, label }) => ({
    name: preferred ? `${numbering}, preferred` : numbering,
    value: label === null ? 'no label' : `${code}${label}`,
    preferred,
  }));
  if (!column) return [...rows, { name: 'reference alignment', value: 'in no row', preferred: false }];
  return [
    ...rows,
    {
      name: `alignment ${column.alignmentName}, revision ${column.revision}`,
      value: `column ${column.column + 1}`,
      preferred: false,
    },
  ];
}

/** The passport as plain text, to paste into a mail or a laboratory book: every number with its numbering. */
export function passportText(passport: Passport): string {
  const { residue, copies, equivalents } = passport;
  const name = wordsForCode(residue.letter).name;
  const lines = [
    `${residue.family} ${residue.letter}${residue.label}, ${name}, ${residue.numbering} numbering, ${residue.organism}`,
    ...passportRows(passport).map(({ name: what, value }) => `${what}: ${value}`),
    ...copies.map(
      ({ structureName, authorId, label }) =>
        `${structureName}, chain ${authorId}: ${label === null ? 'no coordinates' : `author number ${label}`}`,
    ),
    ...equivalents.map(
      ({ organism, family, letter, label, numbering, grade }) =>
        `by equivalence, grade ${grade}: ${family} ${letter}${label}, ${numbering} numbering, ${organism}`,
    ),
  ];
  return lines.join('\n');
}
