import type { Construct, Mutant } from '@/shared/contracts/plans';
import { outOfDate, type Applied, type Fact } from '@/client/facts';
import { keepNewer, newestFirst, putNewer } from '@/client/keep-newer';
import { relabels } from '@/client/relabels';

export interface MutantFilter {
  proteinId?: string;
  residueIndex?: number;
}

export function applyToConstructs(list: Construct[], fact: Fact): Applied<Construct[]> {
  if (fact.kind === 'construct.changed') return putNewer(list, fact.payload, newestFirst);
  return relabels(fact, list) ? outOfDate : list;
}

/** The mutants that change a residue or a protein, or all. */
export function applyToMutants(list: Mutant[], fact: Fact, filter: MutantFilter = {}): Applied<Mutant[]> {
  if (fact.kind === 'mutant.changed') {
    return fits(fact.payload, filter) ? putNewer(list, fact.payload, newestFirst) : list;
  }
  return list.some((mutant) => standsOn(mutant, fact)) ? outOfDate : list;
}

export function applyToMutant(mutant: Mutant, fact: Fact): Applied<Mutant> {
  if (fact.kind === 'mutant.changed' && fact.payload.id === mutant.id) return keepNewer(mutant, fact.payload);
  return standsOn(mutant, fact) ? outOfDate : mutant;
}

function fits({ mutations }: Mutant, { proteinId, residueIndex }: MutantFilter): boolean {
  if (proteinId === undefined) return true;
  return mutations.some(
    ({ residue }) =>
      residue.proteinId === proteinId &&
      (residueIndex === undefined || residue.residueIndex === residueIndex),
  );
}

/** Its residues' labels or its construct's name may have changed. */
function standsOn({ mutations, constructId }: Mutant, fact: Fact): boolean {
  if (fact.kind === 'construct.changed') return fact.payload.id === constructId;
  return relabels(
    fact,
    mutations.map(({ residue }) => residue),
  );
}
