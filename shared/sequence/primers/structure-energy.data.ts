/**
 * ΔG°37 of a stack in kcal/mol, 1 M NaCl, by the two bases read 5′→3′ on one strand.
 * Source: SantaLucia 1998 PNAS 95:1460.
 */
export const STACK_ENERGY_KCAL: Readonly<Record<string, number>> = {
  AA: -1.0,
  TT: -1.0,
  AT: -0.88,
  TA: -0.58,
  CA: -1.45,
  TG: -1.45,
  GT: -1.44,
  AC: -1.44,
  CT: -1.28,
  AG: -1.28,
  GA: -1.3,
  TC: -1.3,
  CG: -2.17,
  GC: -2.24,
  GG: -1.84,
  CC: -1.84,
};

/** Initiation of a duplex, once for each end (kcal/mol, same source). */
export const END_ENERGY_KCAL = { GC: 0.98, AT: 1.03 } as const;

/** Initiation of a hairpin loop by its length in bases (kcal/mol). Source: SantaLucia & Hicks 2004 Annu Rev Biophys 33:415; from memory. */
export const HAIRPIN_LOOP_KCAL: ReadonlyArray<readonly [length: number, kcalPerMol: number]> = [
  [3, 3.5],
  [4, 3.5],
  [5, 3.3],
  [6, 4.0],
  [7, 4.2],
  [8, 4.3],
  [9, 4.5],
  [10, 4.6],
  [12, 5.0],
  [14, 5.1],
  [16, 5.3],
  [18, 5.5],
  [20, 5.7],
  [25, 6.1],
  [30, 6.3],
];

/** Added to a loop of three closed by A·T (kcal/mol, same source). */
export const TRILOOP_AT_CLOSURE_KCAL = 0.5;
