import type { z } from 'zod';
import type { Family as FamilyContract, newFamilyBody } from '../../../shared/contracts';
import type { Unit, UnitOfWork } from '../../db';
import { isDuplicate } from '../../lib/database-errors';
import { newId } from '../../lib/new-id';
import { conflict } from '../../lib/problem';
import type { ProjectAccess } from '../projects';
import { Family } from './family.entity';
import type { FamilyQueries } from './family.queries';

export class FamilyService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly projects: ProjectAccess,
    private readonly queries: FamilyQueries,
  ) {}

  async make(
    personId: string,
    projectId: string,
    body: z.infer<typeof newFamilyBody>,
  ): Promise<FamilyContract> {
    await this.projects.may(personId, projectId, 'edit family');
    return this.unitOfWork.write({ projectId }, async (unit) => {
      const last = await unit.manager.maximum(Family, 'sort', { projectId });
      const family = unit.manager.create(Family, {
        id: newId(),
        projectId,
        ...body,
        aliases: [...new Set(body.aliases)],
        description: '',
        referenceAlignmentId: null,
        preferredNumbering: null,
        sort: (last ?? -1) + 1,
        createdAt: unit.at,
        createdBy: unit.actorId,
      });
      await insertFamily(unit, family);
      await unit.audit({ action: 'family.made', subjectKind: 'family', subjectId: family.id, after: body });
      return this.announce(unit, family.id);
    });
  }

  /** The alignment that says which residues of a family are equivalent, when the family has none yet. */
  async setReferenceIfNone(unit: Unit, familyId: string, alignmentId: string): Promise<FamilyContract> {
    const family = await unit.manager.findOneByOrFail(Family, { id: familyId });
    if (family.referenceAlignmentId === null) {
      await unit.manager.update(Family, { id: familyId }, { referenceAlignmentId: alignmentId });
      await unit.audit({
        action: 'family.reference-set',
        subjectKind: 'family',
        subjectId: familyId,
        after: { referenceAlignmentId: alignmentId },
      });
    }
    return this.announce(unit, familyId);
  }

  /** Tells the project what the family is now, with its count of proteins. */
  async announce(unit: Unit, familyId: string): Promise<FamilyContract> {
    const presented = await this.queries.family(familyId, unit.manager);
    unit.announce('family.changed', familyId, presented);
    return presented;
  }
}

async function insertFamily(unit: Unit, family: Family): Promise<void> {
  try {
    await unit.manager.insert(Family, family);
  } catch (error) {
    if (!isDuplicate(error)) throw error;
    throw conflict('family-name-taken', `There is a family ${family.name} already. Capital letters count.`, {
      fields: [{ path: 'name', message: 'This name is taken.' }],
    });
  }
}
