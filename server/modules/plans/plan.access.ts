import type { UnitOfWork } from '../../db';
import { notFound } from '../../lib/problem';
import type { ProjectAccess } from '../projects';
import { ConstructRevision } from './construct-revision.entity';
import { Construct } from './construct.entity';
import { Mutant } from './mutant.entity';

export interface CurrentConstruct {
  construct: Construct;
  revision: ConstructRevision;
}

/** The only way to constructs and mutants on someone's behalf. */
export class PlanAccess {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly projects: ProjectAccess,
  ) {}

  /** Whoever plans may plan with any construct of the project. */
  async construct(personId: string, projectId: string, constructId: string): Promise<CurrentConstruct> {
    await this.projects.may(personId, projectId, 'read project');
    const construct = await this.unitOfWork.reader.findOneBy(Construct, { id: constructId, projectId });
    const revision =
      construct?.currentRevisionId &&
      (await this.unitOfWork.reader.findOneBy(ConstructRevision, { id: construct.currentRevisionId }));
    if (!construct || !revision) throw notFound('construct');
    return { construct, revision };
  }

  async mutant(personId: string, projectId: string, mutantId: string): Promise<Mutant> {
    await this.projects.may(personId, projectId, 'read project');
    const mutant = await this.unitOfWork.reader.findOneBy(Mutant, { id: mutantId, projectId });
    if (!mutant) throw notFound('mutant');
    return mutant;
  }
}
