import type { Unit } from '../../db';
import { insertMany } from '../../db/insert-many';
import { newId } from '../../lib/new-id';
import { MapCandidate } from './map-candidate.entity';
import { MapSegment } from './map-segment.entity';
import { ResidueMap } from './residue-map.entity';

/** What is proposed for a protein chain; without a protein, a person has to choose. */
export type NewMap = Pick<
  ResidueMap,
  'familyId' | 'proteinId' | 'readiness' | 'reason' | 'identity' | 'coverage' | 'exceptions'
> & {
  segments: Pick<MapSegment, 'chainStart' | 'proteinStart' | 'length'>[];
  /** Best first. */
  candidates: Pick<MapCandidate, 'proteinId' | 'identity' | 'coverage'>[];
};

/** Writes the proposals of a structure's protein chains. */
export async function addMaps(
  unit: Unit,
  proposals: readonly { chainId: string; map: NewMap }[],
): Promise<void> {
  const rows = proposals.map(({ chainId, map: { segments: _, candidates: __, ...map } }) =>
    unit.manager.create(ResidueMap, {
      id: newId(),
      chainId,
      ...map,
      status: 'proposed',
      decidedBy: null,
      decidedAt: null,
      createdAt: unit.at,
      createdBy: unit.actorId,
    }),
  );
  await insertMany(unit.manager, ResidueMap, rows);
  await insertMany(
    unit.manager,
    MapSegment,
    proposals.flatMap(({ map }, at) => segmentRows(rows[at]?.id ?? '', map.proteinId, map.segments)),
  );
  await insertMany(
    unit.manager,
    MapCandidate,
    proposals.flatMap(({ chainId, map }) =>
      map.candidates.map((candidate, at) => ({ chainId, rank: at + 1, ...candidate })),
    ),
  );
}

export function segmentRows(mapId: string, proteinId: string | null, segments: NewMap['segments']) {
  return proteinId === null ? [] : segments.map((segment) => ({ mapId, proteinId, ...segment }));
}
