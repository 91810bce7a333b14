/** Symbols of two letters that atom names in columns 13–14 may spell. Source: IUPAC periodic table. */
const TWO_LETTER_ELEMENTS = new Set(
  (
    'HE LI BE NE NA MG AL SI CL AR CA SC TI CR MN FE CO NI CU ZN GA GE AS SE BR KR RB SR ZR NB MO TC RU RH PD ' +
    'AG CD IN SN SB TE XE CS BA LA CE PR ND SM EU GD TB DY HO ER TM YB LU HF TA RE OS IR PT AU HG TL PB BI TH PA'
  ).split(' '),
);

/**
 * Element of an atom whose element field is empty, from its four-column name (blanks kept) and whether its residue
 * is a polymer's. ` CA ` is a carbon; `CA  ` is calcium, unless its residue is an amino acid: never by name alone.
 */
export function elementFromName(fourColumns: string, inPolymer: boolean): string {
  const name = fourColumns.toUpperCase();
  const first = name.charAt(0);
  const letters = name.replace(/[^A-Z]/g, '');
  if (first < 'A' || first > 'Z') return letters.charAt(0);
  const two = name.slice(0, 2);
  if (two === 'SE') return 'SE';
  if (inPolymer || !TWO_LETTER_ELEMENTS.has(two)) return first;
  // Four letters starting with H are hydrogens with a long locant (HE21, HG11), not helium or mercury.
  return first === 'H' && !name.includes(' ') ? 'H' : two;
}
