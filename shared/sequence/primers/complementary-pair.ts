import type { Issue, ParseResult } from '../parse-result';
import { planCodons } from './codon-plan';
import type { CodingChange, PrimerConstruct } from './construct';
import { PAIR_LIMITS } from './limits';
import { draftWindow, proveDraft, type PairDraft } from './pair-design';
import { DEFAULT_PAIR_SETTINGS, type PairSettings } from './pair-settings';
import { findWindows } from './pair-window';
import type { Design } from './types';

type Scored = { score: number };
const byScore = (a: Scored, b: Scored) => a.score - b.score;

/** Best of each choice of codons first, so that both are seen; the rest by score. */
function orderDrafts(groups: readonly PairDraft[][]): PairDraft[] {
  const sorted = groups.map((group) => [...group].sort(byScore));
  const leaders = sorted.flatMap((group) => group.slice(0, 1)).sort(byScore);
  return [...leaders, ...sorted.flatMap((group) => group.slice(1)).sort(byScore)];
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

  const groups: PairDraft[][] = [];
  const seen = new Set<string>();
  for (const rule of ['host', 'fewest'] as const) {
    const plan = planCodons(construct, changes, chosen.host, rule);
    if (rule === 'host') issues.push(...plan.issues);
    if (plan.value === null) return { value: null, issues };
    const key = plan.value.exchanges.map(({ codonTo }) => codonTo).join();
    if (seen.has(key)) continue;
    seen.add(key);
    const { changes: planned, exchanges } = plan.value;
    const windows = findWindows(construct, exchanges, chosen.windowsTried);
    groups.push(windows.map((window) => draftWindow(construct, planned, window, chosen)));
  }
  const drafts = orderDrafts(groups);
  if (drafts.length === 0)
    return refuse(
      'too-near-the-end',
      `There are not ${PAIR_LIMITS.shortestArm} settled bases on both sides of the change; give more of the plasmid.`,
    );
  const designs: Omit<Design, 'rank'>[] = [];
  let refused = 0;
  for (const draft of drafts) {
    if (designs.length === chosen.maxDesigns) break;
    const design = proveDraft(construct, changes, draft);
    if (design) designs.push(design);
    else refused += 1;
  }
  if (refused > 0)
    issues.push({
      code: 'design-not-proved',
      severity: 'warning',
      message: `${refused} designs were left out: their product, read back, is not surely the one asked for.`,
    });
  if (designs.length === 0)
    return refuse('no-design', 'No pair of primers could be proved to make this change and no other.');
  return { value: designs.sort(byScore).map((design, index) => ({ ...design, rank: index + 1 })), issues };
}
