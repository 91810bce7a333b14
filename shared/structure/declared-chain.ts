import { alignToDeclared } from './align-declared';
import { isLinked } from './chain-breaks';
import type { Declarations, MissingResidue } from './draft';
import type { IssueList } from './issue-list';
import {
  placeByMissing,
  placeWhole,
  type DeclaredSequence,
  type ObservedResidue,
  type Placement,
} from './place-declared';
import { residueKind } from './residue-kind';
import type { AtomArrays } from './types';

export interface PlacedResidue extends ObservedResidue {
  label: string;
  line: number;
  atomStart: number;
  atomCount: number;
}

/** The declared polymer of a chain in one-letter codes, unknown components X, caps left out; null without one. */
export function declaredSequence(declarations: Declarations, chain: string): DeclaredSequence | null {
  const names = declarations.sequences.get(chain);
  if (!names) return null;
  const kept: string[] = [];
  let letters = '';
  for (const name of names) {
    const kind = residueKind(name, declarations.parentOf(name));
    if (kind.kind === 'cap') continue;
    kept.push(name);
    letters += kind.letter || 'X';
  }
  return kept.length > 0 ? { names: kept, letters } : null;
}

/** Declared residues of a chain that a model lacks, caps left out. */
export function missingResidues(declarations: Declarations, chain: string, model: number): MissingResidue[] {
  return (declarations.missing.get(chain) ?? []).filter(
    ({ name, models }) =>
      residueKind(name).kind !== 'cap' && (!models || (models.first <= model && model <= models.last)),
  );
}

/** Places the polymer's residues in the declared sequence: by the list of missing ones, as one piece, or by alignment. */
export function placeObserved(
  residues: readonly PlacedResidue[],
  missing: readonly MissingResidue[],
  declared: DeclaredSequence,
  atoms: AtomArrays,
  budget: { cells: number },
): Placement | null {
  const exact = placeByMissing(residues, missing, declared) ?? placeWhole(residues, declared);
  if (exact) return exact;
  const linked = (index: number): boolean => {
    const before = residues[index - 1];
    const after = residues[index];
    return before !== undefined && after !== undefined && isLinked(atoms, before, after);
  };
  const aligned = alignToDeclared(residues, declared, linked, budget.cells);
  if (aligned) budget.cells -= residues.length * declared.names.length;
  return aligned;
}

/** Tells where a chain differs from its declared sequence. */
export function compareWithDeclared(
  chain: string,
  residues: readonly PlacedResidue[],
  placement: Placement | null,
  declared: DeclaredSequence,
  issues: IssueList,
): void {
  if (!placement) {
    if (residues.length > 0) {
      issues.warn('declared-not-compared', `Chain ${chain} is too long to be compared with its SEQRES.`, {
        chain,
      });
    }
    return;
  }
  for (const [index, residue] of residues.entries()) {
    const place = placement[index];
    const where = { line: residue.line, chain, residue: residue.label };
    if (place === undefined) {
      issues.warn(
        'not-declared',
        `${residue.name} ${residue.label} has no place in the declared sequence.`,
        where,
      );
    } else if (declared.names[place] !== residue.name && declared.letters[place] !== residue.letter) {
      const text = `${residue.label} is ${residue.name} here and ${declared.names[place]} in the declared sequence.`;
      issues.warn('declared-differs', text, where);
    }
  }
}
