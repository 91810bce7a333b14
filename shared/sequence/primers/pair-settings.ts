import { HOSTS, type Host } from '../construct/codon-choice';
import { DEFAULT_MELTING_CONDITIONS, type MeltingConditions } from './melting-conditions';

export interface PairSettings {
  host: Host;
  melting: MeltingConditions;
  /** Designs given back at most. */
  maxDesigns: number;
  /** Begin of the primers' names, e.g. `E62Q`. */
  name: string;
  /** Windows looked at closely for each choice of codons. */
  windowsTried: number;
}

export const DEFAULT_PAIR_SETTINGS: PairSettings = {
  host: HOSTS[0],
  melting: DEFAULT_MELTING_CONDITIONS,
  maxDesigns: 5,
  name: 'mutant',
  windowsTried: 12,
};
