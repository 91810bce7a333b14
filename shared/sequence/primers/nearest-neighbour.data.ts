/** Enthalpy in kcal/mol and entropy in cal/mol/K, 1 M NaCl. */
export type EnthalpyEntropy = readonly [enthalpyKcalPerMol: number, entropyCalPerMolKelvin: number];

export interface NearestNeighbourSet {
  /** Once a duplex. */
  initiation: EnthalpyEntropy;
  /** Once for each end that closes with G·C, or with A·T. */
  endGC: EnthalpyEntropy;
  endAT: EnthalpyEntropy;
  /** Once when the strand is its own reverse complement. */
  symmetry: EnthalpyEntropy;
  /** `XY/ZW` is 5′-XY-3′ over 3′-ZW-5′; a key that is missing is read reversed as a whole, `WZ/YX`. */
  pairs: Readonly<Record<string, EnthalpyEntropy>>;
}

/** SantaLucia 1998 PNAS 95:1460, the unified set (same as Allawi & SantaLucia 1997 Biochemistry 36:10581); values as in Biopython 1.80. */
export const UNIFIED_1998: NearestNeighbourSet = {
  initiation: [0, 0],
  endGC: [0.1, -2.8],
  endAT: [2.3, 4.1],
  symmetry: [0, -1.4],
  pairs: {
    'AA/TT': [-7.9, -22.2],
    'AT/TA': [-7.2, -20.4],
    'TA/AT': [-7.2, -21.3],
    'CA/GT': [-8.5, -22.7],
    'GT/CA': [-8.4, -22.4],
    'CT/GA': [-7.8, -21.0],
    'GA/CT': [-8.2, -22.2],
    'CG/GC': [-10.6, -27.2],
    'GC/CG': [-9.8, -24.4],
    'GG/CC': [-8.0, -19.9],
  },
};

/** SantaLucia & Hicks 2004 Annu Rev Biophys 33:415; values as in Biopython 1.80. */
export const REVISED_2004: NearestNeighbourSet = {
  initiation: [0.2, -5.7],
  endGC: [0, 0],
  endAT: [2.2, 6.9],
  symmetry: [0, -1.4],
  pairs: {
    'AA/TT': [-7.6, -21.3],
    'AT/TA': [-7.2, -20.4],
    'TA/AT': [-7.2, -20.4],
    'CA/GT': [-8.5, -22.7],
    'GT/CA': [-8.4, -22.4],
    'CT/GA': [-7.8, -21.0],
    'GA/CT': [-8.2, -22.2],
    'CG/GC': [-10.6, -27.2],
    'GC/CG': [-9.8, -24.4],
    'GG/CC': [-8.0, -19.0],
  },
};

/**
 * Sugimoto et al. 1996 NAR 24:4501. Values from memory; held by 200 primers × 3 salts computed with Biopython 1.80
 * (table DNA_NN2) to 0.1 °C.
 */
export const SUGIMOTO_1996: NearestNeighbourSet = {
  initiation: [0.6, -9.0],
  endGC: [0, 0],
  endAT: [0, 0],
  symmetry: [0, -1.4],
  pairs: {
    'AA/TT': [-8.0, -21.9],
    'AT/TA': [-5.6, -15.2],
    'TA/AT': [-6.6, -18.4],
    'CA/GT': [-8.2, -21.0],
    'GT/CA': [-9.4, -25.5],
    'CT/GA': [-6.6, -16.4],
    'GA/CT': [-8.8, -23.5],
    'CG/GC': [-11.8, -29.0],
    'GC/CG': [-10.5, -26.4],
    'GG/CC': [-10.9, -28.4],
  },
};

/**
 * One mismatched pair within a stack (and the tandem G·T stacks), 1 M NaCl.
 * Sources: Allawi & SantaLucia 1997 Biochemistry 36:10581, 1998 Biochemistry 37:2170 and 37:9435, 1998 NAR 26:2694;
 * Peyret et al. 1999 Biochemistry 38:3468; values as in Biopython 1.80 (DNA_IMM1).
 */
export const INTERNAL_MISMATCH: Readonly<Record<string, EnthalpyEntropy>> = {
  'AG/TT': [1.0, 0.9],
  'AT/TG': [-2.5, -8.3],
  'CG/GT': [-4.1, -11.7],
  'CT/GG': [-2.8, -8.0],
  'GG/CT': [3.3, 10.4],
  'GG/TT': [5.8, 16.3],
  'GT/CG': [-4.4, -12.3],
  'GT/TG': [4.1, 9.5],
  'TG/AT': [-0.1, -1.7],
  'TG/GT': [-1.4, -6.2],
  'TT/AG': [-1.3, -5.3],
  'AA/TG': [-0.6, -2.3],
  'AG/TA': [-0.7, -2.3],
  'CA/GG': [-0.7, -2.3],
  'CG/GA': [-4.0, -13.2],
  'GA/CG': [-0.6, -1.0],
  'GG/CA': [0.5, 3.2],
  'TA/AG': [0.7, 0.7],
  'TG/AA': [3.0, 7.4],
  'AC/TT': [0.7, 0.2],
  'AT/TC': [-1.2, -6.2],
  'CC/GT': [-0.8, -4.5],
  'CT/GC': [-1.5, -6.1],
  'GC/CT': [2.3, 5.4],
  'GT/CC': [5.2, 13.5],
  'TC/AT': [1.2, 0.7],
  'TT/AC': [1.0, 0.7],
  'AA/TC': [2.3, 4.6],
  'AC/TA': [5.3, 14.6],
  'CA/GC': [1.9, 3.7],
  'CC/GA': [0.6, -0.6],
  'GA/CC': [5.2, 14.2],
  'GC/CA': [-0.7, -3.8],
  'TA/AC': [3.4, 8.0],
  'TC/AA': [7.6, 20.2],
  'AA/TA': [1.2, 1.7],
  'CA/GA': [-0.9, -4.2],
  'GA/CA': [-2.9, -9.8],
  'TA/AA': [4.7, 12.9],
  'AC/TC': [0.0, -4.4],
  'CC/GC': [-1.5, -7.2],
  'GC/CC': [3.6, 8.9],
  'TC/AC': [6.1, 16.4],
  'AG/TG': [-3.1, -9.5],
  'CG/GG': [-4.9, -15.3],
  'GG/CG': [-6.0, -15.8],
  'TG/AG': [1.6, 3.6],
  'AT/TT': [-2.7, -10.8],
  'CT/GT': [-5.0, -15.8],
  'GT/CT': [-2.2, -8.4],
  'TT/AT': [0.2, -1.5],
};
