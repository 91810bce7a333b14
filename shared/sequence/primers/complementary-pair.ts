import type { Issue, ParseResult } from '../parse-result';
import { planCodons } from './codon-plan';
import type { CodingChange, PrimerConstruct } from './construct';
import { PAIR_LIMITS } from './limits';
import { designWindow } from './pair-design';
import { DEFAULT_PAIR_SETTINGS, type PairSettings } from './pair-settings';
import { findWindows } from './pair-window';
import type { Design } from './types';

/** Best of each choice of codons first, so that both are seen; the rest by score. */
function rankDesigns(groups: readonly Design[][], maxDesigns: number): Design[] {
  const byScore = (a: Design, b: Design) => a.score - b.score;
  const sorted = groups.map((group) => [...group].sort(byScore));
  const leaders = sorted.flatMap((group) => group.slice(0, 1)).sort(byScore);
  const others = sorted.flatMap((group) => group.slice(1)).sort(byScore);
  return [...leaders, ...others]
    .slice(0, maxDesigns)
    .sort(byScore)
    .map((design, index) => ({ ...design, rank: index + 1 }));
}

/**
 * Designs of two fully complementary primers with the changes in their middle, best first; those that miss a limit come last with the
 * failed check named, those that do not prove are left out. Both choices of codon (host preference, fewest changes) are tried.
 *
 * Errors: `no-changes`, `changes-too-far-apart`, `too-near-the-end`, `no-codon`, `no-design`. Warnings: `linear-construct`,
 * `design-not-proved`, and those of the codon choice.
 */
export function designComplementaryPair(
  construct: PrimerConstruct,
  changes: readonly CodingChange[],
  settings: Partial<PairSettings> = {},
): ParseResult<Design[]> {
  const chosen = { ...DEFAULT_PAIR_SETTINGS, ...settings };
  const issues: Issue[] = [];
  const refuse = (code: string, message: string): ParseResult<Design[]> => ({
    value: null,
    issues: [...issues, { code, severity: 'error', message }],
  });
  if (changes.length === 0) return refuse('no-changes', 'No change is asked for.');
  const codons = changes.map(({ codon }) => codon);
  const span = 3 * (Math.max(...codons) - Math.min(...codons) + 1);
  const widest = PAIR_LIMITS.longestBases - 2 * PAIR_LIMITS.shortestArm;
  if (span > widest)
    return refuse(
      'changes-too-far-apart',
      `The changes span ${span} bases; one pair reaches over ${widest}. Make them one after the other.`,
    );
  if (!construct.circular)
    issues.push({
      code: 'linear-construct',
      severity: 'warning',
      message:
        'Second places for the primers are looked for in the pasted DNA only; give the whole plasmid to see all.',
    });

  const groups: Design[][] = [];
  const seen = new Set<string>();
  let windowCount = 0;
  let refused = 0;
  for (const rule of ['host', 'fewest'] as const) {
    const plan = planCodons(construct, changes, chosen.host, rule);
    if (rule === 'host') issues.push(...plan.issues);
    if (plan.value === null) return { value: null, issues };
    const key = plan.value.exchanges.map(({ codonTo }) => codonTo).join();
    if (seen.has(key)) continue;
    seen.add(key);
    const windows = findWindows(construct, plan.value.exchanges, chosen.windowsTried);
    windowCount += windows.length;
    const { changes: planned } = plan.value;
    const designs = windows.flatMap(
      (window) => designWindow(construct, changes, planned, window, chosen) ?? [],
    );
    refused += windows.length - designs.length;
    if (designs.length > 0) groups.push(designs);
  }
  if (windowCount === 0)
    return refuse(
      'too-near-the-end',
      `There are not ${PAIR_LIMITS.shortestArm} settled bases on both sides of the change; give more of the plasmid.`,
    );
  if (refused > 0)
    issues.push({
      code: 'design-not-proved',
      severity: 'warning',
      message: `${refused} of ${windowCount} designs were left out: their product, read back, is not surely the one asked for.`,
    });
  if (groups.length === 0)
    return refuse('no-design', 'No pair of primers could be proved to make this change and no other.');
  return { value: rankDesigns(groups, chosen.maxDesigns), issues };
}
