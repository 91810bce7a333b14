/** Chemistry of a side chain, as a sequence is tinted. */
export type ResidueChemistry =
  'acidic' | 'basic' | 'polar' | 'aliphatic' | 'aromatic' | 'glycine' | 'proline' | 'cysteine';

export interface AminoAcid {
  letter: string;
  /** `Glu` */
  code: string;
  /** `Glutamate`, the charged name where the side chain is charged at neutral pH. */
  name: string;
  /** Null for letters that stand for several. */
  chemistry: ResidueChemistry | null;
  /** Stands for more than one amino acid: B, Z, J, X. */
  ambiguous: boolean;
}

const row = (
  letter: string,
  code: string,
  name: string,
  chemistry: ResidueChemistry | null,
  ambiguous = false,
): AminoAcid => ({ letter, code, name, chemistry, ambiguous });

/**
 * Amino acids in the order of BLOSUM62, then the extended letters.
 * Source: IUPAC-IUB JCBN 1984 Eur J Biochem 138:9 (letters, codes); U and O by later recommendations.
 * Classes: common practice, no source (histidine counted as basic, methionine as aliphatic).
 */
export const AMINO_ACIDS: readonly AminoAcid[] = [
  row('A', 'Ala', 'Alanine', 'aliphatic'),
  row('R', 'Arg', 'Arginine', 'basic'),
  row('N', 'Asn', 'Asparagine', 'polar'),
  row('D', 'Asp', 'Aspartate', 'acidic'),
  row('C', 'Cys', 'Cysteine', 'cysteine'),
  row('Q', 'Gln', 'Glutamine', 'polar'),
  row('E', 'Glu', 'Glutamate', 'acidic'),
  row('G', 'Gly', 'Glycine', 'glycine'),
  row('H', 'His', 'Histidine', 'basic'),
  row('I', 'Ile', 'Isoleucine', 'aliphatic'),
  row('L', 'Leu', 'Leucine', 'aliphatic'),
  row('K', 'Lys', 'Lysine', 'basic'),
  row('M', 'Met', 'Methionine', 'aliphatic'),
  row('F', 'Phe', 'Phenylalanine', 'aromatic'),
  row('P', 'Pro', 'Proline', 'proline'),
  row('S', 'Ser', 'Serine', 'polar'),
  row('T', 'Thr', 'Threonine', 'polar'),
  row('W', 'Trp', 'Tryptophan', 'aromatic'),
  row('Y', 'Tyr', 'Tyrosine', 'aromatic'),
  row('V', 'Val', 'Valine', 'aliphatic'),
  row('B', 'Asx', 'Aspartate or asparagine', null, true),
  row('Z', 'Glx', 'Glutamate or glutamine', null, true),
  row('J', 'Xle', 'Isoleucine or leucine', null, true),
  row('X', 'Xaa', 'Unknown residue', null, true),
  row('U', 'Sec', 'Selenocysteine', 'cysteine'),
  row('O', 'Pyl', 'Pyrrolysine', 'basic'),
];
