export const NEAREST_NEIGHBOUR_SETS = ['unified', 'revised2004', 'sugimoto1996'] as const;
export type NearestNeighbourSetName = (typeof NEAREST_NEIGHBOUR_SETS)[number];

export const SALT_METHODS = ['none', 'santalucia', 'owczarzy-monovalent', 'owczarzy-divalent'] as const;
export type SaltMethod = (typeof SALT_METHODS)[number];

/** What the oligonucleotide is in. Ions in mmol/L, strands in nmol/L. */
export interface MeltingConditions {
  set: NearestNeighbourSetName;
  salt: SaltMethod;
  sodiumMillimolar: number;
  potassiumMillimolar: number;
  trisMillimolar: number;
  magnesiumMillimolar: number;
  dntpMillimolar: number;
  oligoNanomolar: number;
  templateNanomolar: number;
}

export const DEFAULT_MELTING_CONDITIONS: MeltingConditions = {
  set: 'unified',
  salt: 'santalucia',
  sodiumMillimolar: 50,
  potassiumMillimolar: 0,
  trisMillimolar: 0,
  magnesiumMillimolar: 0,
  dntpMillimolar: 0,
  oligoNanomolar: 250,
  templateNanomolar: 0,
};

/** Monovalent cations in mmol/L; half of the Tris carries a charge. */
export function monovalentMillimolar(conditions: MeltingConditions): number {
  return conditions.sodiumMillimolar + conditions.potassiumMillimolar + conditions.trisMillimolar / 2;
}

/**
 * Sodium with the same effect as the monovalent cations and the magnesium not held by dNTP, in mmol/L.
 * Source: von Ahsen et al. 2001 Clin Chem 47:1956.
 */
export function sodiumEquivalentMillimolar(conditions: MeltingConditions): number {
  const { magnesiumMillimolar, dntpMillimolar } = conditions;
  const monovalent = monovalentMillimolar(conditions);
  if (magnesiumMillimolar <= dntpMillimolar) return monovalent;
  return monovalent + 120 * Math.sqrt(magnesiumMillimolar - dntpMillimolar);
}
