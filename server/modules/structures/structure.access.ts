import type { Act } from '../../../shared/permissions';
import type { UnitOfWork } from '../../db';
import { notFound } from '../../lib/problem';
import type { ProjectAccess } from '../projects';
import { Chain } from './chain.entity';
import { StructureRevision } from './structure-revision.entity';
import { Structure } from './structure.entity';

/** The only way to a structure or one of its chains on someone's behalf. */
export class StructureAccess {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly projects: ProjectAccess,
  ) {}

  async structure(
    personId: string,
    projectId: string,
    structureId: string,
    act: Act = 'read project',
  ): Promise<Structure> {
    await this.projects.may(personId, projectId, act);
    const structure = await this.unitOfWork.reader.findOneBy(Structure, { id: structureId, projectId });
    if (!structure) throw notFound('structure');
    return structure;
  }

  async chain(
    personId: string,
    projectId: string,
    chainId: string,
    act: Act = 'read project',
  ): Promise<{ chain: Chain; structure: Structure }> {
    await this.projects.may(personId, projectId, act);
    const reader = this.unitOfWork.reader;
    const chain = await reader.findOneBy(Chain, { id: chainId });
    const revision = chain && (await reader.findOneBy(StructureRevision, { id: chain.revisionId }));
    const structure =
      revision && (await reader.findOneBy(Structure, { id: revision.structureId, projectId }));
    if (!chain || !structure) throw notFound('chain');
    return { chain, structure };
  }
}
