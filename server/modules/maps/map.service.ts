import type { z } from 'zod';
import type { ChainMap, mapDecisionBody } from '../../../shared/contracts';
import type { Unit, UnitOfWork } from '../../db';
import { insertMany } from '../../db/insert-many';
import { stale, unusable } from '../../lib/problem';
import { addProteins, type FamilyService } from '../families';
import { Chain, type StructureAccess, type StructureQueries } from '../structures';
import { segmentRows } from './map.adding';
import type { DecisionPlanner, PlannedDecision } from './map.planner';
import type { MapQueries } from './map.queries';
import { MapSegment } from './map-segment.entity';
import { ResidueMap } from './residue-map.entity';

/** Told after each decision, so that an upload whose last chain is decided is done. */
export type SettleUpload = (unit: Unit, structureRevisionId: string) => Promise<void>;

export class MapService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly access: StructureAccess,
    private readonly planner: DecisionPlanner,
    private readonly queries: MapQueries,
    private readonly structures: StructureQueries,
    private readonly families: FamilyService,
    private readonly settleUpload: SettleUpload,
  ) {}

  async decide(
    personId: string,
    projectId: string,
    chainId: string,
    version: number,
    body: z.infer<typeof mapDecisionBody>,
  ): Promise<ChainMap> {
    const { chain, structure } = await this.access.chain(personId, projectId, chainId, 'confirm map');
    const planned = await this.planner.plan(personId, projectId, structure.name, chain, body);
    return this.unitOfWork.write({ projectId }, async (unit) => {
      const map = await unit.manager.findOneByOrFail(ResidueMap, { chainId });
      if (map.version !== version) throw stale((await this.queries.ofChains([chainId], unit.manager))[0]);
      await this.apply(unit, map, planned, structure.name);
      const [presented] = await this.finish(unit, structure.id, chain.revisionId, [chainId]);
      if (!presented) throw new Error('The map just decided cannot be read.');
      return presented;
    });
  }

  /** Confirms every chain of the structure that can be confirmed as it is; gives those back. */
  async confirmReady(personId: string, projectId: string, structureId: string): Promise<ChainMap[]> {
    const structure = await this.access.structure(personId, projectId, structureId, 'confirm map');
    const revisionId = structure.currentRevisionId;
    if (!revisionId) return [];
    return this.unitOfWork.write({ projectId }, async (unit) => {
      const ready = await unit.manager
        .createQueryBuilder(ResidueMap, 'map')
        .innerJoin(Chain, 'chain', 'chain.id = map.chainId')
        .where({ status: 'proposed', readiness: 'ready' })
        .andWhere('chain.revisionId = :revisionId', { revisionId })
        .orderBy('chain.ordinal')
        .getMany();
      const confirmed = { status: 'confirmed', action: 'map.confirmed' } as const;
      for (const map of ready) await this.apply(unit, map, confirmed, structure.name);
      if (ready.length === 0) return [];
      return this.finish(
        unit,
        structureId,
        revisionId,
        ready.map((map) => map.chainId),
      );
    });
  }

  private async apply(
    unit: Unit,
    map: ResidueMap,
    planned: PlannedDecision,
    structureName: string,
  ): Promise<void> {
    const before = { status: map.status, proteinId: map.proteinId };
    // What is confirmed may have been taken back, or proposed anew, since it was looked at.
    if (planned.status === 'confirmed' && !planned.target && !map.proteinId)
      throw unusable(
        'nothing-proposed',
        'Nothing is proposed for this chain. Choose a protein, add one, or leave it out.',
      );
    if (planned.target) await this.place(unit, map, planned.target);
    if (planned.status === 'left out') await unit.manager.delete(MapSegment, { mapId: map.id });
    await unit.manager.save(
      Object.assign(map, { status: planned.status, decidedBy: unit.actorId, decidedAt: unit.at }),
    );
    const { authorId } = await unit.manager.findOneByOrFail(Chain, { id: map.chainId });
    await unit.audit({
      action: planned.action,
      subjectKind: 'chain',
      subjectId: map.chainId,
      before,
      after: {
        status: map.status,
        proteinId: map.proteinId,
        name: `chain ${authorId} of ${structureName}`,
      },
    });
  }

  /** Lays the chain on the protein the person named. */
  private async place(
    unit: Unit,
    map: ResidueMap,
    target: NonNullable<PlannedDecision['target']>,
  ): Promise<void> {
    const { familyId, mapped, reason } = target;
    let proteinId: string | null = target.proteinId;
    if (target.proteinId === null) {
      const { ids } = await addProteins(unit, { id: familyId, projectId: target.projectId }, [target.added]);
      proteinId = ids[0] ?? null;
      await this.families.announce(unit, familyId);
    }
    const { segments, identity, coverage, exceptions, readiness } = mapped;
    Object.assign(map, { familyId, proteinId, identity, coverage, exceptions, readiness, reason });
    await unit.manager.delete(MapSegment, { mapId: map.id });
    await insertMany(unit.manager, MapSegment, segmentRows(map.id, proteinId, segments));
  }

  private async finish(
    unit: Unit,
    structureId: string,
    revisionId: string,
    chainIds: readonly string[],
  ): Promise<ChainMap[]> {
    const decided = await this.queries.ofChains(chainIds, unit.manager);
    for (const chain of decided) unit.announce('map.decided', chain.chainId, chain);
    unit.announce('structure.changed', structureId, await this.structures.byId(structureId, unit.manager));
    await this.settleUpload(unit, revisionId);
    return decided;
  }
}
