import { DEFAULT_GAP_RULES, type GapRules } from '@/shared/sequence/mapping/pairwise';
import { numberOption, type ParsedOptions } from './options';

/** Options that say what a gap costs. */
export const GAP_OPTIONS = { open: 'text', extend: 'text' } as const;

const LIMITS = { min: 0, max: 1000 };

/** Gap costs from `--open` and `--extend`; ends are free. */
export function gapRulesOf(options: ParsedOptions): GapRules {
  return {
    ...DEFAULT_GAP_RULES,
    openPenalty: numberOption(options, 'open', DEFAULT_GAP_RULES.openPenalty, LIMITS),
    extendPenalty: numberOption(options, 'extend', DEFAULT_GAP_RULES.extendPenalty, LIMITS),
  };
}
