import { assembleChain, type AssemblyContext } from './assemble-chain';
import type { Draft } from './draft';
import type { IssueList } from './issue-list';
import type { Chain, StructureModel } from './types';

/**
 * Puts a model together from what a reader found, whatever the format. Null with an error when no chain holds a
 * polymer. `placementCells` bounds the work of comparing chains with their declared sequences.
 */
export function assembleModel(
  draft: Draft,
  placementCells: number,
  issues: IssueList,
): StructureModel | null {
  const startOfResidue = startsInOrder(draft);
  const atoms = draft.atoms.arrange(startOfResidue);
  const context: AssemblyContext = {
    draft,
    atoms,
    startOfResidue,
    issues,
    budget: { cells: placementCells },
  };
  warnOfZeroOccupancy(draft, issues);
  const chains = draft.chains.map((chain) => assembleChain(chain, context));
  warnOfUnseenChains(draft, chains, issues);
  if (chains.every((chain) => chain.residues.length === 0)) {
    issues.error('no-polymer', 'No chain of this file holds an amino acid or a nucleotide.');
    return null;
  }
  return {
    format: draft.format,
    title: draft.declarations.title,
    modelCount: draft.modelCount,
    modelNumber: draft.modelNumber,
    chains,
    atoms,
  };
}

/** First atom of each residue once atoms stand chain by chain: residues and ligands in file order, then waters. */
function startsInOrder(draft: Draft): Int32Array {
  const starts = new Int32Array(draft.residues.length);
  let next = 0;
  for (const chain of draft.chains) {
    for (const list of [chain.residues, chain.waters]) {
      for (const index of list) {
        starts[index] = next;
        next += draft.residues[index]?.atomCount ?? 0;
      }
    }
  }
  return starts;
}

function warnOfZeroOccupancy(draft: Draft, issues: IssueList): void {
  for (const residue of draft.residues) {
    if (residue.zeroOccupancyLine === 0) continue;
    const label = `${residue.authorNumber}${residue.insertionCode}`;
    issues.warn(
      'occupancy-zero',
      `${residue.name} ${label} has atoms of occupancy 0: their positions are not evidence.`,
      { line: residue.zeroOccupancyLine, column: 55, chain: draft.chains[residue.chain]?.id, residue: label },
    );
  }
}

function warnOfUnseenChains(draft: Draft, chains: readonly Chain[], issues: IssueList): void {
  const seen = new Set(chains.map((chain) => chain.id));
  for (const id of draft.declarations.sequences.keys()) {
    if (seen.has(id)) continue;
    issues.warn('chain-without-coordinates', `Chain ${id} is declared, but this model has no atom of it.`, {
      chain: id,
    });
  }
}
