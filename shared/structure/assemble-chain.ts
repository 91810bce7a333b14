import {
  compareWithDeclared,
  declaredSequence,
  missingResidues,
  placeObserved,
  type PlacedResidue,
} from './declared-chain';
import { residueLabel, type Draft, type DraftChain, type DraftResidue } from './draft';
import type { IssueList } from './issue-list';
import { freePlaces, type DeclaredSequence, type Placement } from './place-declared';
import { polymerMembership, type Classified } from './polymer-membership';
import { residueKind } from './residue-kind';
import type { AtomArrays, Chain, ChainResidue } from './types';

/** What the chains of one model share while they are put together. */
export interface AssemblyContext {
  draft: Draft;
  atoms: AtomArrays;
  /** First atom of each draft residue in the arranged arrays. */
  startOfResidue: Int32Array;
  issues: IssueList;
  budget: { cells: number };
}

interface Member extends Classified {
  placed: PlacedResidue;
}

/** One chain: its polymer in file order, compared with what the file declares, and what else carries its id. */
export function assembleChain(chain: DraftChain, context: AssemblyContext): Chain {
  const { draft, atoms, issues, budget } = context;
  const { declarations, modelNumber } = draft;
  const members = chain.residues.flatMap((index) => memberOf(index, chain.id, context));
  const roles = polymerMembership(members);
  const declared = declaredSequence(declarations, chain.id);
  const missing = missingResidues(declarations, chain.id, modelNumber);
  const base = members.filter((_, index) => roles[index] === 'polymer').map(({ placed }) => placed);
  const placement = declared ? placeObserved(base, missing, declared, atoms, budget) : null;
  if (declared) compareWithDeclared(chain.id, base, placement, declared, issues);

  const places = new Map(base.map((residue, index) => [residue, placement?.[index]]));
  if (declared) placeFreeResidues(members, roles, base, placement ?? [], declared, places);
  const polymer = members.filter((_, index) => roles[index] === 'polymer');
  const others = members.filter((_, index) => roles[index] !== 'polymer');
  warnOfDoubts(chain, members, roles, declared, issues);
  return {
    id: chain.id,
    labelIds: chain.labelIds,
    kind: kindOf(polymer),
    declared: declared?.letters ?? null,
    observed: polymer.map(({ kind }) => kind.letter).join(''),
    residues: polymer.map((member) => residueOf(member, places.get(member.placed))),
    ligands: others.map(({ placed: { name, label, atomStart, atomCount } }) => ({
      name,
      label,
      atomStart,
      atomCount,
    })),
    waters: chain.waters.length,
    missing: missing.map((residue) => residueLabel(residue.authorNumber, residue.insertionCode)),
    differences: declarations.differences.get(chain.id) ?? [],
    references: declarations.references.get(chain.id) ?? [],
  };
}

function memberOf(index: number, chainId: string, { draft, startOfResidue }: AssemblyContext): Member[] {
  const residue = draft.residues[index];
  if (!residue) return [];
  const label = residueLabel(residue.authorNumber, residue.insertionCode);
  const kind = residueKind(residue.name, draft.declarations.parentOf(residue.name, chainId, label));
  const { name, authorNumber, insertionCode, line, atomCount } = residue;
  const atomStart = startOfResidue[index] ?? 0;
  const placed = {
    name,
    letter: kind.letter,
    authorNumber,
    insertionCode,
    label,
    line,
    atomStart,
    atomCount,
  };
  return [{ draft: residue, kind, placed }];
}

/** Turns the free residues that the declared sequence has a place for into part of the polymer. */
function placeFreeResidues(
  members: readonly Member[],
  roles: ReturnType<typeof polymerMembership>,
  base: readonly PlacedResidue[],
  placement: Placement,
  declared: DeclaredSequence,
  places: Map<PlacedResidue, number | undefined>,
): void {
  const placeOf = freePlaces(base, placement, declared);
  for (const [index, { placed }] of members.entries()) {
    if (roles[index] !== 'free') continue;
    const place = placeOf(placed);
    if (place === undefined) continue;
    roles[index] = 'polymer';
    places.set(placed, place);
  }
}

function residueOf({ draft, kind, placed }: Member, declaredIndex: number | undefined): ChainResidue {
  return {
    label: placed.label,
    authorNumber: placed.authorNumber,
    insertionCode: placed.insertionCode,
    name: placed.name,
    letter: kind.letter,
    ...(kind.parent === undefined ? {} : { parent: kind.parent }),
    atomStart: placed.atomStart,
    atomCount: placed.atomCount,
    alternates: draft.alternates,
    ...(declaredIndex === undefined ? {} : { declaredIndex }),
  };
}

function kindOf(polymer: readonly Member[]): Chain['kind'] {
  if (polymer.length === 0) return 'other';
  const aminoAcids = polymer.filter(({ kind }) => kind.kind === 'amino').length;
  return aminoAcids * 2 >= polymer.length ? 'protein' : 'nucleic';
}

/** Things a person should know of before trusting the chain. */
function warnOfDoubts(
  chain: DraftChain,
  members: readonly Member[],
  roles: readonly string[],
  declared: DeclaredSequence | null,
  issues: IssueList,
): void {
  const lastPolymer = roles.lastIndexOf('polymer');
  const declaredNames = new Set(declared?.names);
  for (const [index, { draft, kind, placed }] of members.entries()) {
    const where = { line: draft.line, chain: chain.id, residue: placed.label };
    if (
      kind.kind === 'other' &&
      (isWithin(draft, chain, index < lastPolymer) || declaredNames.has(draft.name))
    ) {
      const text = `${draft.name} ${placed.label} stands in the polymer, but its parent is not known: listed as a ligand.`;
      issues.warn('unknown-parent', text, where);
    } else if (roles[index] === 'free' && !draft.hetero) {
      issues.warn(
        'free-residue',
        `${draft.name} ${placed.label} stands alone after the chain's end: a ligand.`,
        where,
      );
    }
  }
  const back = members.find(
    ({ draft }, index) => roles[index] === 'polymer' && draft.segment > 0 && !draft.hetero,
  );
  if (back) {
    issues.warn('chain-continues', `Chain ${chain.id} goes on after its end (TER).`, {
      line: back.draft.line,
      chain: chain.id,
      residue: back.placed.label,
    });
  }
  const polymer = members.filter((_, index) => roles[index] === 'polymer');
  const written = members.some(({ draft }) => !draft.hetero);
  if (written && polymer.every(({ kind }) => kind.letter === 'X')) {
    issues.warn('chain-without-sequence', `No residue of chain ${chain.id} tells what it is.`, {
      line: members[0]?.draft.line,
      chain: chain.id,
    });
  }
}

/** Before the end (TER) of its chain's polymer, or, where no end is written, before another of its residues. */
function isWithin(draft: DraftResidue, chain: DraftChain, beforeAnother: boolean): boolean {
  return draft.segment === 0 && (chain.segment > 0 || beforeAnother);
}
