import type { Act } from '../../../shared/permissions';
import type { UnitOfWork } from '../../db';
import { notFound } from '../../lib/problem';
import type { ProjectAccess } from '../projects';
import { Family } from './family.entity';
import { Protein } from './protein.entity';

/** The only way to a family or a protein on someone's behalf. */
export class FamilyAccess {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly projects: ProjectAccess,
  ) {}

  async family(
    personId: string,
    projectId: string,
    familyId: string,
    act: Act = 'read project',
  ): Promise<Family> {
    await this.projects.may(personId, projectId, act);
    const family = await this.unitOfWork.reader.findOneBy(Family, { id: familyId, projectId });
    if (!family) throw notFound('family');
    return family;
  }

  async protein(
    personId: string,
    projectId: string,
    proteinId: string,
    act: Act = 'read project',
  ): Promise<Protein> {
    await this.projects.may(personId, projectId, act);
    const protein = await this.unitOfWork.reader.findOneBy(Protein, { id: proteinId, projectId });
    if (!protein) throw notFound('protein');
    return protein;
  }
}
