import type { GeneticCodeId } from './genetic-code';

export interface GeneticCodeTable {
  id: GeneticCodeId;
  name: string;
  /** One letter a codon, first, second and third base each in the order T, C, A, G; stops as `*`. */
  aminoAcids: string;
  starts: readonly string[];
}

/**
 * Translation tables of NCBI ("The Genetic Codes", https://www.ncbi.nlm.nih.gov/Taxonomy/Utils/wprintgc.cgi), public domain,
 * read as shipped in Biopython 1.80.
 */
export const GENETIC_CODE_TABLES: readonly GeneticCodeTable[] = [
  {
    id: 1,
    name: 'Standard (nuclear)',
    aminoAcids: 'FFLLSSSSYY**CC*WLLLLPPPPHHQQRRRRIIIMTTTTNNKKSSRRVVVVAAAADDEEGGGG',
    starts: ['ATG', 'CTG', 'TTG'],
  },
  {
    id: 2,
    name: 'Vertebrate mitochondrial',
    aminoAcids: 'FFLLSSSSYY**CCWWLLLLPPPPHHQQRRRRIIMMTTTTNNKKSS**VVVVAAAADDEEGGGG',
    starts: ['ATA', 'ATC', 'ATG', 'ATT', 'GTG'],
  },
  {
    id: 3,
    name: 'Yeast mitochondrial',
    aminoAcids: 'FFLLSSSSYY**CCWWTTTTPPPPHHQQRRRRIIMMTTTTNNKKSSRRVVVVAAAADDEEGGGG',
    starts: ['ATA', 'ATG', 'GTG'],
  },
  {
    id: 4,
    name: 'Mould and protozoan mitochondrial, Mycoplasma',
    aminoAcids: 'FFLLSSSSYY**CCWWLLLLPPPPHHQQRRRRIIIMTTTTNNKKSSRRVVVVAAAADDEEGGGG',
    starts: ['ATA', 'ATC', 'ATG', 'ATT', 'CTG', 'GTG', 'TTA', 'TTG'],
  },
  {
    id: 5,
    name: 'Invertebrate mitochondrial',
    aminoAcids: 'FFLLSSSSYY**CCWWLLLLPPPPHHQQRRRRIIMMTTTTNNKKSSSSVVVVAAAADDEEGGGG',
    starts: ['ATA', 'ATC', 'ATG', 'ATT', 'GTG', 'TTG'],
  },
  {
    id: 11,
    name: 'Bacterial, archaeal and plastid',
    aminoAcids: 'FFLLSSSSYY**CC*WLLLLPPPPHHQQRRRRIIIMTTTTNNKKSSRRVVVVAAAADDEEGGGG',
    starts: ['ATA', 'ATC', 'ATG', 'ATT', 'CTG', 'GTG', 'TTG'],
  },
];
