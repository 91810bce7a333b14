import type { DraftResidue } from './draft';
import { isPolymerKind, type ResidueKind } from './residue-kind';

/** A residue with what its component is. */
export interface Classified {
  draft: DraftResidue;
  kind: ResidueKind;
}

/**
 * For each residue of one chain, in file order: part of its polymer, or a `free` one that a declared sequence may
 * still place. Before the chain's end every amino acid and nucleotide is part, HETATM or not. After it, a run with
 * two or more ATOM residues is the chain coming back; a residue alone, or written as HETATM, is free.
 */
export function polymerMembership(residues: readonly Classified[]): ('polymer' | 'free' | 'ligand')[] {
  const members: ('polymer' | 'free' | 'ligand')[] = residues.map(({ draft, kind }) => {
    if (!isPolymerKind(kind.kind)) return 'ligand';
    return draft.segment === 0 ? 'polymer' : 'free';
  });
  for (let from = 0; from < residues.length;) {
    const to = endOfRun(residues, members, from);
    const written = residues.slice(from, to).filter(({ draft }) => !draft.hetero).length;
    if (members[from] === 'free' && written >= 2) members.fill('polymer', from, to);
    from = to;
  }
  return members;
}

function endOfRun(residues: readonly Classified[], members: readonly string[], from: number): number {
  let to = from + 1;
  while (
    to < residues.length &&
    members[to] === members[from] &&
    residues[to]?.draft.segment === residues[from]?.draft.segment
  ) {
    to++;
  }
  return to;
}
