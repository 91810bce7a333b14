import { complement, reverseComplement, wrap, type Strand } from '../construct/bases';
import { baseIndex } from '../positions';
import { annealTo } from './annealing';
import type { CodingChange, PrimerConstruct } from './construct';
import { PAIR_LIMITS } from './limits';
import { meltingCelsius } from './melting';
import { findMispriming } from './mispriming';
import { checkMispriming, checkStructure, checkWindow, threePrimeIndex } from './pair-checks';
import type { PairSettings } from './pair-settings';
import { windowStart, type PairWindow } from './pair-window';
import { provePair } from './prove';
import type { Check, CodonChange, Design, Primer } from './types';

const NAME_BASES = 24;

/** Names without blanks and signs that suppliers refuse [common practice, no source]. */
function primerName(name: string, suffix: string): string {
  return `${name.replace(/[^A-Za-z0-9-]+/g, '_').slice(0, NAME_BASES)}_${suffix}`;
}

function makePrimer(
  construct: PrimerConstruct,
  window: PairWindow,
  settings: PairSettings,
  direction: 'F' | 'R',
): { primer: Primer; checks: Check[] } {
  const along = direction === 'F';
  const bases = along ? window.changed : reverseComplement(window.changed);
  const original = along ? window.original : reverseComplement(window.original);
  const other: Strand = construct.coding.strand === '+' ? '-' : '+';
  const strand = along ? construct.coding.strand : other;
  const name = primerName(settings.name, direction);
  const start = windowStart(construct, window);
  const structure = checkStructure(name, bases);
  const threePrime = threePrimeIndex(start, bases.length, strand);
  const annealing = annealTo(bases, complement(original), settings.melting);
  const primer: Primer = {
    name,
    bases,
    strand,
    start: baseIndex(start),
    length: bases.length,
    gcPercent: window.gcPercent,
    meltingCelsius: meltingCelsius(bases, settings.melting),
    annealingCelsius: annealing.celsius,
    annealingBasis: annealing.basis,
    hairpinKcalPerMol: structure.hairpinKcalPerMol,
    selfDimerKcalPerMol: structure.selfDimerKcalPerMol,
    misprimingSites: findMispriming(construct.priming, bases, {
      strand,
      threePrime: wrap(threePrime, construct.bases.length),
    }),
  };
  return { primer, checks: [...structure.checks, checkMispriming(primer)] };
}

/**
 * Penalties, lower is better: missed limits, distance to the pair rule, what is to be looked at, second places, seldom codons, uneven
 * arms, length. The weights are a choice, no source.
 */
function scoreOf(
  window: PairWindow,
  codons: readonly CodonChange[],
  checks: readonly Check[],
  primers: readonly Primer[],
): number {
  const missed = checks.filter(({ severity, passed }) => severity === 'limit' && !passed).length;
  const looks = checks.filter(
    ({ name, severity, passed }) => severity === 'advice' && !passed && name !== 'mispriming',
  ).length;
  const places = primers.reduce((sum, primer) => sum + primer.misprimingSites.length, 0);
  const seldom = codons.reduce((sum, { hostShare }) => sum + (hostShare === null ? 0 : 1 - hostShare), 0);
  const score =
    1000 * missed +
    Math.abs(window.ruleCelsius - PAIR_LIMITS.lowestRuleCelsius) +
    looks +
    5 * places +
    2 * seldom +
    0.2 * Math.abs(window.armBefore - window.armBehind) +
    0.05 * window.length;
  return Math.round(score * 100) / 100;
}

function reasonsOf(window: PairWindow, changes: readonly CodonChange[], checks: readonly Check[]): string[] {
  const codons = changes.map(({ label, codonFrom, codonTo, changedBases, hostShare, chosenBy }) => {
    const share = hostShare === null ? 'no host share' : `host share ${hostShare.toFixed(2)}`;
    const why = {
      host: 'preferred by the host',
      fewest: 'fewest changed bases',
      both: 'preferred by the host and fewest changed bases',
    }[chosenBy];
    return `codon ${label}: ${codonFrom} to ${codonTo}, ${changedBases} changed, ${share}, ${why}`;
  });
  const missed = checks
    .filter(({ passed }) => !passed)
    .map(({ label, primer, value, limit, severity }) => {
      const figure = value === null ? 'not known' : String(Math.round(value * 10) / 10);
      return `${severity === 'limit' ? 'failed' : 'look'}: ${label}${primer ? ` of ${primer}` : ''} ${figure}, ${limit}`;
    });
  return [
    `${window.length} bases, ${window.ruleCelsius.toFixed(1)} °C by the pair rule`,
    ...codons,
    ...missed,
  ];
}

/** A design whose product has not been read back yet. */
export type PairDraft = Omit<Design, 'rank' | 'product' | 'encodes' | 'proved'>;

/** One design for one window, with all figures and checks but the proof. */
export function draftWindow(
  construct: PrimerConstruct,
  codons: readonly CodonChange[],
  window: PairWindow,
  settings: PairSettings,
): PairDraft {
  const forward = makePrimer(construct, window, settings, 'F');
  const reverse = makePrimer(construct, window, settings, 'R');
  const primers = [forward.primer, reverse.primer];
  const checks = [...checkWindow(window), ...forward.checks, ...reverse.checks];
  return {
    scheme: 'complementary-pair',
    score: scoreOf(window, codons, checks, primers),
    reasons: reasonsOf(window, codons, checks),
    changes: [...codons],
    primers,
    checks,
    withinLimits: checks.every(({ severity, passed }) => severity === 'advice' || passed),
  };
}

/** The draft with its product, or null when that, read back from the primers, is not what was asked. */
export function proveDraft(
  construct: PrimerConstruct,
  changes: readonly CodingChange[],
  draft: PairDraft,
): Omit<Design, 'rank'> | null {
  const [forward, reverse] = draft.primers;
  const { bases, circular, coding } = construct;
  const asked = changes.map(({ codon, to }) => ({ codon, to }));
  const proof = provePair({ bases, circular, coding, asked }, forward?.bases ?? '', reverse?.bases ?? '');
  const { product, encodes, proved } = proof;
  return proved ? { ...draft, product, encodes, proved } : null;
}
