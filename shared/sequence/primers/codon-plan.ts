import { wrap } from '../construct/bases';
import { chooseCodons, type Host } from '../construct/codon-choice';
import type { Issue, ParseResult } from '../parse-result';
import { givenIndex, type CodingChange, type PrimerConstruct } from './construct';
import type { CodonExchange } from './pair-window';
import type { CodonChange } from './types';

/** New codons for all changes of one mutant, chosen by one rule. */
export interface CodonPlan {
  changes: CodonChange[];
  exchanges: CodonExchange[];
}

/** Chooses the new codons; issues of the choice name the residue. Errors: `no-codon`. */
export function planCodons(
  construct: PrimerConstruct,
  changes: readonly CodingChange[],
  host: Host,
  rule: 'host' | 'fewest',
): ParseResult<CodonPlan> {
  const { sense, coding, codingStart } = construct;
  const issues: Issue[] = [];
  const planned: CodonChange[] = [];
  const exchanges: CodonExchange[] = [];
  for (const change of changes) {
    const along = codingStart + 3 * change.codon;
    const codonFrom = [0, 1, 2].map((step) => sense.charAt(wrap(along + step, sense.length))).join('');
    const choice = chooseCodons({ codonFrom, to: change.to, table: coding.table, host });
    issues.push(...choice.issues.map((issue) => ({ ...issue, residue: change.label })));
    if (choice.value === null) return { value: null, issues };
    const option = rule === 'host' ? (choice.value.host ?? choice.value.fewest) : choice.value.fewest;
    const agreed = choice.value.host?.codon === choice.value.fewest.codon;
    exchanges.push({ along, codonTo: option.codon });
    planned.push({
      residueIndex: change.residueIndex,
      label: change.label,
      from: change.from,
      to: change.to,
      codonFrom,
      codonTo: option.codon,
      codonStart: givenIndex(construct, along),
      changedBases: option.changedBases,
      hostShare: option.share,
      chosenBy: agreed ? 'both' : choice.value.host === null ? 'fewest' : rule,
    });
  }
  return { value: { changes: planned, exchanges }, issues };
}
