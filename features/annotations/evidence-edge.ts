import type { Annotation } from '@/shared/contracts/annotations';
import type { EvidenceEdge } from '@/components/residue';

type EvidenceKind = Annotation['evidence'][number]['kind'];

/** What each kind of evidence is worth as a sign; a citation or a remark alone says neither. */
const signOf: Record<EvidenceKind, EvidenceEdge | null> = {
  coordinates: 'observed',
  density: 'observed',
  mutant: 'observed',
  'cross-link or label': 'observed',
  'single-molecule rotation': 'observed',
  conservation: 'predicted',
  calculation: 'predicted',
  publication: null,
  other: null,
};

/** How sure a statement is at its own residue: observed when any of its evidence is, else predicted, else unsaid. */
export function evidenceEdge({ evidence }: Pick<Annotation, 'evidence'>): EvidenceEdge | null {
  const signs = evidence.map(({ kind }) => signOf[kind]);
  if (signs.includes('observed')) return 'observed';
  return signs.includes('predicted') ? 'predicted' : null;
}
