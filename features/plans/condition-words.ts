import type { Host } from '@/shared/sequence/construct/codon-choice';
import { isGeneticCodeId, geneticCodeName } from '@/shared/sequence/construct/genetic-code';
import {
  DEFAULT_MELTING_CONDITIONS,
  type MeltingConditions,
} from '@/shared/sequence/primers/melting-conditions';

const setNames: Record<MeltingConditions['set'], string> = {
  unified: 'unified nearest-neighbour set (SantaLucia 1998)',
  revised2004: 'nearest-neighbour set of SantaLucia and Hicks 2004',
  sugimoto1996: 'nearest-neighbour set of Sugimoto 1996',
};
const saltNames: Record<MeltingConditions['salt'], string> = {
  none: 'without salt correction',
  santalucia: 'salt correction of SantaLucia 1998',
  'owczarzy-monovalent': 'salt correction of Owczarzy 2004',
  'owczarzy-divalent': 'salt correction of Owczarzy 2008',
};

/** `50 mM Na, 250 nM primer`: what the calculated temperatures hold for. */
export function concentrationWords(conditions: MeltingConditions = DEFAULT_MELTING_CONDITIONS): string {
  const millimolar: [string, number][] = [
    ['Na', conditions.sodiumMillimolar],
    ['K', conditions.potassiumMillimolar],
    ['Tris', conditions.trisMillimolar],
    ['Mg', conditions.magnesiumMillimolar],
    ['dNTP', conditions.dntpMillimolar],
  ];
  const ions = millimolar.filter(([, value]) => value > 0).map(([name, value]) => `${value} mM ${name}`);
  return [...ions, `${conditions.oligoNanomolar} nM primer`].join(', ');
}

/** How they are calculated. */
export function methodWords(conditions: MeltingConditions = DEFAULT_MELTING_CONDITIONS): string {
  return `${setNames[conditions.set]}, ${saltNames[conditions.salt]}`;
}

/** `11, Bacterial`. */
export function geneticCodeWords(table: number): string {
  return isGeneticCodeId(table) ? `${table}, ${geneticCodeName(table)}` : String(table);
}

export const hostOptions: readonly { value: Host; label: string }[] = [
  { value: 'ecoli', label: 'E. coli K-12' },
  { value: 'yeast', label: 'S. cerevisiae, nuclear genes' },
];
