import type { Strand } from '../construct/bases';
import type { BaseIndex, ResidueIndex } from '../positions';

export type { Strand };

/** Ways of making a change with primers. Only those in `SUPPORTED_SCHEMES` are designed; the others are answered with an issue. */
export const SCHEME_NAMES = [
  'complementary-pair',
  'partial-overlap',
  'back-to-back',
  'overlap-extension',
] as const;
export type SchemeName = (typeof SCHEME_NAMES)[number];
export const SUPPORTED_SCHEMES: readonly SchemeName[] = ['complementary-pair'];

/** One figure held against its limit. A `limit` that is missed puts the design last; an `advice` only weighs in the ranking. */
export interface Check {
  /** Kebab-case and stable, e.g. `pair-rule-melting`. */
  name: string;
  /** In words for a person, e.g. "Pair rule melting temperature". */
  label: string;
  /** Name of the primer it is about; absent when it is about the pair. */
  primer?: string;
  severity: 'limit' | 'advice';
  passed: boolean;
  /** Null when it cannot be computed. */
  value: number | null;
  /** The limit in words with its unit, e.g. "at least 78 °C". */
  limit: string;
  /** Where the limit comes from. */
  basis: string;
}

/** Where else in the construct the 3′ end of a primer could bind. */
export interface MisprimingSite {
  /** Index of the site's first base on the strand as given, from 0. */
  start: BaseIndex;
  length: number;
  /** The strand whose letters the primer would carry there. */
  strand: Strand;
  /** `last-15`: at least 12 of the last 15 bases with the last 5 exact; `exact-end`: the whole 3′ end exact. */
  rule: 'last-15' | 'exact-end';
  matched: number;
}

export interface Primer {
  name: string;
  /** 5′→3′, A C G T only. */
  bases: string;
  /** The strand of the construct, as it was given, whose letters the primer carries. */
  strand: Strand;
  /**
   * Index of the lowest base covered on the construct as given, from 0, for both strands. A primer across the origin of a
   * circular construct starts near its end and goes on at 0.
   */
  start: BaseIndex;
  length: number;
  gcPercent: number;
  /** Nearest-neighbour, salt-corrected, against its perfect complement (the product). */
  meltingCelsius: number | null;
  /** The same against the unchanged template. */
  annealingCelsius: number | null;
  /** How `annealingCelsius` was found: the whole primer with its mismatches, or the more stable arm that fits. */
  annealingBasis: 'whole-with-mismatch' | 'matched-arm';
  /** kcal/mol at 37 °C, 1 M salt; 0 when no stem forms. */
  hairpinKcalPerMol: number;
  /** kcal/mol at 37 °C, 1 M salt, of the most stable ungapped pairing with a copy of itself. */
  selfDimerKcalPerMol: number;
  misprimingSites: MisprimingSite[];
}

/** How the new codon was chosen. `both`: host preference and fewest changes agree. */
export type CodonChoiceRule = 'host' | 'fewest' | 'both';

/** One codon change of a design. */
export interface CodonChange {
  residueIndex: ResidueIndex;
  /** As people read it in the chosen numbering, e.g. "62". */
  label: string;
  from: string;
  to: string;
  codonFrom: string;
  codonTo: string;
  /** Index of the codon's first base (reading direction) on the construct as given. */
  codonStart: BaseIndex;
  changedBases: number;
  /** Share of `codonTo` among its synonyms in the host, 0–1; null when no table fits the genetic code. */
  hostShare: number | null;
  chosenBy: CodonChoiceRule;
}

/** One way in which a product does not encode what was asked. */
export interface ProofDifference {
  code:
    | 'primers-do-not-anneal'
    | 'primers-anneal-in-several-places'
    | 'primers-do-not-pair'
    | 'length-changed'
    | 'change-missing'
    | 'other-residue-changed'
    | 'stop-changed'
    | 'other-base-changed';
  message: string;
  residueIndex?: ResidueIndex;
  baseIndex?: BaseIndex;
}

/** A set of primers that makes one mutant, with everything a person needs to judge it. Plain JSON. */
export interface Design {
  scheme: SchemeName;
  /** From 1, best first. */
  rank: number;
  /** Penalty: lower is better. Its parts are in `reasons`. */
  score: number;
  reasons: string[];
  changes: CodonChange[];
  primers: Primer[];
  /** Whole DNA after the change; of a circular construct from its first base on. */
  product: string;
  /** Protein read back from `product`, without the final stop. */
  encodes: string;
  /** The product, built from the primer strings, encodes the asked change and no other. Only proved designs are given back. */
  proved: boolean;
  checks: Check[];
  /** No check of severity `limit` failed. */
  withinLimits: boolean;
}
