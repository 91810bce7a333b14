import type { Issue, ParseResult } from '../parse-result';
import { countDifferences } from './bases';
import { ECOLI_CODON_SHARES, YEAST_CODON_SHARES } from './codon-usage.data';
import { codonsOf, type GeneticCodeId } from './genetic-code';

export const HOSTS = ['ecoli', 'yeast'] as const;
export type Host = (typeof HOSTS)[number];

/** Codons of a smaller share are taken only when there is no other [common practice, no source]. */
export const RARE_SHARE = 0.1;

/** Nuclear or chromosomal usage holds for these tables only; mitochondrial genes have their own. */
const USAGE: Record<
  Host,
  { tables: readonly GeneticCodeId[]; shares: Readonly<Record<string, number>>; label: string }
> = {
  ecoli: { tables: [1, 11], shares: ECOLI_CODON_SHARES, label: 'E. coli K-12' },
  yeast: { tables: [1], shares: YEAST_CODON_SHARES, label: 'S. cerevisiae, nuclear' },
};

export interface CodonOption {
  codon: string;
  /** Share among its synonyms in the host, 0–1; null without a table for this genetic code. */
  share: number | null;
  rare: boolean;
  /** Against the old codon. */
  changedBases: number;
}

export interface CodonChoice {
  /** Highest share in the host; null without a table. */
  host: CodonOption | null;
  /** Fewest changed bases, ties by share. */
  fewest: CodonOption;
  /** All codons of the new residue, by share, then by changes. */
  synonyms: CodonOption[];
}

const byShare = (a: CodonOption, b: CodonOption) =>
  (b.share ?? 0) - (a.share ?? 0) || a.changedBases - b.changedBases;
const byChanges = (a: CodonOption, b: CodonOption) =>
  a.changedBases - b.changedBases || (b.share ?? 0) - (a.share ?? 0);

/**
 * New codons for a residue: the one the host prefers and the one with the fewest changed bases; rare ones are left out unless
 * nothing else is there, and the old codon itself always. Errors: `no-codon` (the letter has none in this table).
 * Warnings: `no-codon-usage` (no usage table for this genetic code in this host), `rare-codon`.
 */
export function chooseCodons(request: {
  codonFrom: string;
  to: string;
  table: GeneticCodeId;
  host: Host;
}): ParseResult<CodonChoice> {
  const { codonFrom, to, table, host } = request;
  const usage = USAGE[host];
  const known = usage.tables.includes(table);
  const synonyms = codonsOf(to, table)
    .filter((codon) => codon !== codonFrom)
    .map((codon): CodonOption => {
      const share = known ? (usage.shares[codon] ?? null) : null;
      return {
        codon,
        share,
        rare: share !== null && share < RARE_SHARE,
        changedBases: countDifferences(codon, codonFrom),
      };
    })
    .sort(byShare);
  const usable = synonyms.some(({ rare }) => !rare) ? synonyms.filter(({ rare }) => !rare) : synonyms;
  const [preferred] = usable;
  const [fewest] = [...usable].sort(byChanges);
  if (!preferred || !fewest)
    return {
      value: null,
      issues: [
        { code: 'no-codon', severity: 'error', message: `No other codon of table ${table} encodes ${to}.` },
      ],
    };
  const issues: Issue[] = [];
  if (!known)
    issues.push({
      code: 'no-codon-usage',
      severity: 'warning',
      message: `There is no codon usage of ${usage.label} for genetic code ${table}; the codon with the fewest changes is taken.`,
    });
  if (fewest.rare)
    issues.push({
      code: 'rare-codon',
      severity: 'warning',
      message: `Every codon of ${to} is rare in ${usage.label}.`,
    });
  return { value: { host: known ? preferred : null, fewest, synonyms }, issues };
}
