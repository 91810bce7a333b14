import type { Protein } from '@/shared/contracts/families';
import { codeOfLetter } from '@/shared/sequence/alphabet';
import { checkMutant, type ResidueChange } from '@/shared/sequence/construct/mutation-check';
import { parseMutations } from '@/shared/sequence/construct/mutation';
import { labelOfResidue, residueOfLabel } from '@/shared/sequence/numbering/numbering';
import { residueIndex, type ResidueIndex } from '@/shared/sequence/positions';
import type { Issue } from '@/shared/sequence/parse-result';
import { preferredNumberingOf } from './protein-labels';

/** What is known of a change while it is typed. */
export interface ChangeView {
  /** Only where all of it fits the protein. */
  changes: ResidueChange[];
  issues: Issue[];
  /** Exchanges that would fit, nearest first. */
  suggestions: string[];
  /** A residue was named and what it becomes not yet: what stands there. */
  unfinished: { letter: string; label: string; sentence: string } | null;
}

const nothing: ChangeView = { changes: [], issues: [], suggestions: [], unfinished: null };

/** Reads a change such as `E62Q` in the protein's preferred numbering, as the server will; its family may stand in front. */
export function viewChange(text: string, protein: Protein, families: readonly string[] = []): ChangeView {
  if (text.trim() === '') return nothing;
  const numbering = preferredNumberingOf(protein);
  const unfinished = readUnfinished(text, protein, (label) => residueOfLabel(numbering, label));
  if (unfinished) return { ...nothing, unfinished };
  const parsed = parseMutations(text, {}, families);
  if (parsed.value === null) return { ...nothing, issues: parsed.issues };
  const [request, another] = parsed.value;
  if (!request) return nothing;
  if (another) {
    const message = 'Plan one mutant at a time; changes made together are joined by +, like E62Q+R41K.';
    return { ...nothing, issues: [{ code: 'several-mutants', severity: 'error', message }] };
  }
  const { value, issues, suggestions } = checkMutant(request, protein.residues, numbering);
  return { changes: value?.changes ?? [], issues, suggestions, unfinished: null };
}

function readUnfinished(text: string, protein: Protein, indexOf: (label: string) => ResidueIndex | null) {
  const match = /^(?:[A-Za-z]{3}|[A-Za-z])?(-?\d{1,6}[a-z]?)$/.exec(text.trim());
  const label = match?.[1];
  if (label === undefined) return null;
  const index = indexOf(label);
  if (index === null) return null;
  const letter = protein.residues[index] ?? '';
  const becomes = letter === 'A' ? 'S' : 'A';
  const stands = `At ${label} stands ${codeOfLetter(letter)} (${letter}).`;
  return {
    letter,
    label,
    sentence: `${stands} Write behind it what it becomes, such as ${letter}${label}${becomes}.`,
  };
}

/** What is wrong, in one text; empty when nothing is. */
export function errorsOf(view: Pick<ChangeView, 'issues'>): string {
  return view.issues
    .filter(({ severity }) => severity === 'error')
    .map(({ message }) => message)
    .join(' ');
}

/** `E62`, the beginning of a change at a residue; empty when it has no label. */
export function beginningOfChange(protein: Protein, index: number): string {
  const label = labelOfResidue(preferredNumberingOf(protein), residueIndex(index));
  return label === null ? '' : `${protein.residues[index] ?? ''}${label}`;
}
