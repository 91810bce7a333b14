import { In, type EntityManager } from 'typeorm';
import type {
  ChainMap,
  Structure as StructureContract,
  StructureWithChains,
} from '../../../shared/contracts';
import type { UnitOfWork } from '../../db';
import type { PeopleDirectory } from '../auth';
import { StructureRevision } from './structure-revision.entity';
import { Structure } from './structure.entity';

/** What structures show of the maps of their chains; the module of maps knows structures, not the other way. */
export interface MapReader {
  /** The chains of a revision with their maps, in the order of the file. */
  ofRevision(revisionId: string, manager?: EntityManager): Promise<ChainMap[]>;
  /** How many chains of each revision wait for a curator; none is 0. */
  waiting(revisionIds: readonly string[], manager?: EntityManager): Promise<ReadonlyMap<string, number>>;
}

/** Structures in their current revision. The manager is that of the unit when called inside one. */
export class StructureQueries {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly people: PeopleDirectory,
    private readonly maps: MapReader,
  ) {}

  async ofProject(projectId: string): Promise<StructureContract[]> {
    const structures = await this.unitOfWork.reader.find(Structure, {
      where: { projectId },
      order: { id: 'DESC' },
    });
    return this.present(structures);
  }

  async withChains(structure: Structure): Promise<StructureWithChains> {
    const presented = await this.one(structure);
    return { ...presented, chains: await this.maps.ofRevision(presented.revisionId) };
  }

  async byId(structureId: string, manager: EntityManager): Promise<StructureContract> {
    return this.one(await manager.findOneByOrFail(Structure, { id: structureId }), manager);
  }

  private async one(structure: Structure, manager?: EntityManager): Promise<StructureContract> {
    const [presented] = await this.present([structure], manager);
    if (!presented) throw new Error(`Structure ${structure.id} has no current revision.`);
    return presented;
  }

  private async present(
    structures: readonly Structure[],
    manager: EntityManager = this.unitOfWork.reader,
  ): Promise<StructureContract[]> {
    const ids = structures.flatMap((structure) => structure.currentRevisionId ?? []);
    const revisions = await manager.findBy(StructureRevision, { id: In(ids) });
    const waiting = await this.maps.waiting(ids, manager);
    const brief = await this.people.briefs(revisions.map((revision) => revision.createdBy));
    const byId = new Map(revisions.map((revision) => [revision.id, revision]));
    return structures.flatMap((structure) => {
      const revision = byId.get(structure.currentRevisionId ?? '');
      if (!revision) return [];
      const { format, title, modelCount, chainCount, atomCount, fileName, issues } = revision;
      return [
        {
          id: structure.id,
          name: structure.name,
          revisionId: revision.id,
          revision: revision.revision,
          format,
          title,
          modelCount,
          chainCount,
          atomCount,
          waiting: waiting.get(revision.id) ?? 0,
          fileName,
          issues,
          by: brief(revision.createdBy),
          at: revision.createdAt.toISOString(),
          version: structure.version,
        },
      ];
    });
  }
}
