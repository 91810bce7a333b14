/** One-letter and three-letter codes and names: IUPAC-IUB recommendations 1983 (Eur. J. Biochem. 138, 9–37). */
export type Chemistry =
  'acidic' | 'basic' | 'polar' | 'aliphatic' | 'aromatic' | 'glycine' | 'proline' | 'cysteine';

export interface AminoAcidWords {
  name: string;
  threeLetter: string;
  /** Left out where the letter stands for more than one residue. */
  chemistry?: Chemistry;
}

export const aminoAcidWords: Readonly<Record<string, AminoAcidWords>> = {
  A: { name: 'alanine', threeLetter: 'Ala', chemistry: 'aliphatic' },
  R: { name: 'arginine', threeLetter: 'Arg', chemistry: 'basic' },
  N: { name: 'asparagine', threeLetter: 'Asn', chemistry: 'polar' },
  D: { name: 'aspartate', threeLetter: 'Asp', chemistry: 'acidic' },
  C: { name: 'cysteine', threeLetter: 'Cys', chemistry: 'cysteine' },
  Q: { name: 'glutamine', threeLetter: 'Gln', chemistry: 'polar' },
  E: { name: 'glutamate', threeLetter: 'Glu', chemistry: 'acidic' },
  G: { name: 'glycine', threeLetter: 'Gly', chemistry: 'glycine' },
  H: { name: 'histidine', threeLetter: 'His', chemistry: 'basic' },
  I: { name: 'isoleucine', threeLetter: 'Ile', chemistry: 'aliphatic' },
  L: { name: 'leucine', threeLetter: 'Leu', chemistry: 'aliphatic' },
  K: { name: 'lysine', threeLetter: 'Lys', chemistry: 'basic' },
  M: { name: 'methionine', threeLetter: 'Met', chemistry: 'aliphatic' },
  F: { name: 'phenylalanine', threeLetter: 'Phe', chemistry: 'aromatic' },
  P: { name: 'proline', threeLetter: 'Pro', chemistry: 'proline' },
  S: { name: 'serine', threeLetter: 'Ser', chemistry: 'polar' },
  T: { name: 'threonine', threeLetter: 'Thr', chemistry: 'polar' },
  W: { name: 'tryptophan', threeLetter: 'Trp', chemistry: 'aromatic' },
  Y: { name: 'tyrosine', threeLetter: 'Tyr', chemistry: 'aromatic' },
  V: { name: 'valine', threeLetter: 'Val', chemistry: 'aliphatic' },
  U: { name: 'selenocysteine', threeLetter: 'Sec', chemistry: 'cysteine' },
  O: { name: 'pyrrolysine', threeLetter: 'Pyl', chemistry: 'basic' },
  B: { name: 'aspartate or asparagine', threeLetter: 'Asx' },
  Z: { name: 'glutamate or glutamine', threeLetter: 'Glx' },
  J: { name: 'isoleucine or leucine', threeLetter: 'Xle' },
  X: { name: 'unknown residue', threeLetter: 'Xaa' },
};
