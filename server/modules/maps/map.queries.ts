import { In, type EntityManager } from 'typeorm';
import type { ChainMap } from '../../../shared/contracts';
import type { UnitOfWork } from '../../db';
import type { PeopleDirectory } from '../auth';
import type { ProteinDirectory } from '../families';
import { Chain, ChainLabel, StructureRevision, type MapReader } from '../structures';
import { MapCandidate } from './map-candidate.entity';
import { presentChainMap } from './map.presenter';
import { MapSegment } from './map-segment.entity';
import { ResidueMap } from './residue-map.entity';

const grouped = <Row>(rows: readonly Row[], keyOf: (row: Row) => string): Map<string, Row[]> => {
  const groups = new Map<string, Row[]>();
  for (const row of rows) {
    const group = groups.get(keyOf(row));
    if (group) group.push(row);
    else groups.set(keyOf(row), [row]);
  }
  return groups;
};

/** Chains with their maps. The manager is that of the unit when called inside one. */
export class MapQueries implements MapReader {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly people: PeopleDirectory,
    private readonly proteins: ProteinDirectory,
  ) {}

  async ofRevision(revisionId: string, manager: EntityManager = this.unitOfWork.reader): Promise<ChainMap[]> {
    const chains = await manager.find(Chain, { where: { revisionId }, order: { ordinal: 'ASC' } });
    return this.present(chains, manager);
  }

  async ofChains(
    chainIds: readonly string[],
    manager: EntityManager = this.unitOfWork.reader,
  ): Promise<ChainMap[]> {
    const chains = await manager.find(Chain, { where: { id: In([...chainIds]) }, order: { ordinal: 'ASC' } });
    return this.present(chains, manager);
  }

  async waiting(
    revisionIds: readonly string[],
    manager: EntityManager = this.unitOfWork.reader,
  ): Promise<ReadonlyMap<string, number>> {
    const rows: { revisionId: string; waiting: string }[] = await manager
      .createQueryBuilder(ResidueMap, 'map')
      .innerJoin(Chain, 'chain', 'chain.id = map.chainId')
      .select('chain.revisionId', 'revisionId')
      .addSelect('COUNT(*)', 'waiting')
      .where({ status: 'proposed' })
      .andWhere('chain.revisionId IN (:...revisionIds)', { revisionIds: ['', ...revisionIds] })
      .groupBy('chain.revisionId')
      .getRawMany();
    return new Map(rows.map((row) => [row.revisionId, Number(row.waiting)]));
  }

  /** Whole objects, in the order given, in a fixed number of queries. */
  private async present(chains: readonly Chain[], manager: EntityManager): Promise<ChainMap[]> {
    const chainId = In(chains.map((chain) => chain.id));
    const revisions = await manager.findBy(StructureRevision, {
      id: In([...new Set(chains.map((chain) => chain.revisionId))]),
    });
    const labels = await manager.find(ChainLabel, {
      where: { chainId },
      order: { chainId: 'ASC', chainIndex: 'ASC' },
    });
    const maps = await manager.findBy(ResidueMap, { chainId });
    const segments = await manager.find(MapSegment, {
      where: { mapId: In(maps.map((map) => map.id)) },
      order: { mapId: 'ASC', chainStart: 'ASC' },
    });
    const candidates = await manager.find(MapCandidate, {
      where: { chainId },
      order: { chainId: 'ASC', rank: 'ASC' },
    });
    const proteins = await this.proteins.byIds(
      [...maps.flatMap((map) => map.proteinId ?? []), ...candidates.map((one) => one.proteinId)],
      manager,
    );
    const families = await this.proteins.familiesByIds(
      [...proteins.values()].map((protein) => protein.familyId),
      manager,
    );
    const brief = await this.people.briefs(maps.flatMap((map) => map.decidedBy ?? []));
    const labelsOf = grouped(labels, (label) => label.chainId);
    const candidatesOf = grouped(candidates, (candidate) => candidate.chainId);
    const segmentsOf = grouped(segments, (segment) => segment.mapId);
    const structureOf = new Map(revisions.map((revision) => [revision.id, revision.structureId]));
    const mapOf = new Map(maps.map((map) => [map.chainId, map]));
    return chains.map((chain) => {
      const map = mapOf.get(chain.id) ?? null;
      return presentChainMap(chain, {
        structureId: structureOf.get(chain.revisionId) ?? '',
        labels: labelsOf.get(chain.id) ?? [],
        map,
        segments: segmentsOf.get(map?.id ?? '') ?? [],
        candidates: candidatesOf.get(chain.id) ?? [],
        proteins,
        families,
        brief,
      });
    });
  }
}
