import type { ChainMap, PersonBrief } from '../../../shared/contracts';
import { writeLabel } from '../../../shared/sequence/numbering/label-text';
import { sha256 } from '../../lib/hash';
import type { Family, Protein } from '../families';
import type { Chain, ChainLabel } from '../structures';
import type { MapCandidate } from './map-candidate.entity';
import type { MapSegment } from './map-segment.entity';
import type { ResidueMap } from './residue-map.entity';

/** What stands around a chain when it is shown. */
export interface ChainContext {
  structureId: string;
  labels: readonly ChainLabel[];
  /** Null for a chain that is not a protein. */
  map: ResidueMap | null;
  segments: readonly MapSegment[];
  candidates: readonly MapCandidate[];
  proteins: ReadonlyMap<string, Protein>;
  families: ReadonlyMap<string, Family>;
  brief: (personId: string) => PersonBrief;
}

const notProtein = { protein: '', nucleic: 'DNA or RNA, not a protein.', other: 'Not a protein.' } as const;

export function presentChainMap(chain: Chain, context: ChainContext): ChainMap {
  const { structureId, labels, map, segments, proteins, families } = context;
  const protein = proteins.get(map?.proteinId ?? '');
  const first = labels[0];
  const last = labels.at(-1);
  return {
    chainId: chain.id,
    structureId,
    authorId: chain.authorId,
    labelIds: chain.labelIds,
    kind: chain.kind,
    observedLength: chain.observed.length,
    declaredLength: chain.declared?.length ?? null,
    sequenceKey: sha256(`${chain.declared ?? ''}\n${chain.observed}`).slice(0, 16),
    missingCount: chain.missing.length,
    firstLabel: first ? writeLabel({ number: first.firstNumber, suffix: first.suffix }) : '',
    lastLabel: last ? writeLabel({ number: last.firstNumber + last.length - 1, suffix: last.suffix }) : '',
    status: map?.status ?? null,
    readiness: map?.readiness ?? 'none',
    reason: map?.reason ?? notProtein[chain.kind],
    familyId: map?.familyId ?? null,
    proteinId: map?.proteinId ?? null,
    organism: protein?.organism ?? null,
    identity: map?.identity ?? null,
    coverage: map?.coverage ?? null,
    proteinLength: protein?.residues.length ?? null,
    segments: segments.map(({ chainStart, proteinStart, length }) => ({ chainStart, proteinStart, length })),
    exceptions: map?.exceptions ?? [],
    candidates: context.candidates.flatMap(({ proteinId, identity, coverage }) => {
      const candidate = proteins.get(proteinId);
      const family = families.get(candidate?.familyId ?? '');
      if (!candidate || !family) return [];
      const { organism, familyId } = candidate;
      return [{ proteinId, familyId, family: family.name, organism, identity, coverage }];
    }),
    decidedBy: map?.decidedBy ? context.brief(map.decidedBy) : null,
    version: map?.version ?? 1,
  };
}
