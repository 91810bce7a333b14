import type { ParseResult } from '../parse-result';
import { designComplementaryPair } from './complementary-pair';
import type { CodingChange, PrimerConstruct } from './construct';
import type { PairSettings } from './pair-settings';
import { SUPPORTED_SCHEMES, SCHEME_NAMES, type Design, type SchemeName } from './types';

/**
 * Designs of one mutant by one scheme, or by all there are. Every design is proved. Error `scheme-not-yet` (a warning when all are
 * asked for), else the issues of the scheme.
 */
export function designMutant(
  construct: PrimerConstruct,
  changes: readonly CodingChange[],
  scheme: SchemeName | 'all',
  settings: Partial<PairSettings> = {},
): ParseResult<Design[]> {
  if (scheme !== 'all' && !SUPPORTED_SCHEMES.includes(scheme))
    return {
      value: null,
      issues: [
        {
          code: 'scheme-not-yet',
          severity: 'error',
          message: `The scheme ${scheme} is not designed yet; take ${SUPPORTED_SCHEMES.join(', ')}.`,
        },
      ],
    };
  const made = designComplementaryPair(construct, changes, settings);
  if (scheme !== 'all') return made;
  const missing = SCHEME_NAMES.filter((name) => !SUPPORTED_SCHEMES.includes(name));
  return {
    value: made.value,
    issues: [
      ...made.issues,
      { code: 'scheme-not-yet', severity: 'warning', message: `Not designed yet: ${missing.join(', ')}.` },
    ],
  };
}
