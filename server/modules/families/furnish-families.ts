import { newId } from '../../lib/new-id';
import { insertMany } from '../../db/insert-many';
import type { ProjectFurnisher } from '../projects';
import { Family } from './family.entity';
import { motorFamilies } from './motor-families.data';

/** A new project comes with the families of its kind of motor. */
export const furnishFamilies: ProjectFurnisher = (unit, project) =>
  insertMany(
    unit.manager,
    Family,
    motorFamilies[project.motorKind].map((seed, sort) => ({
      id: newId(),
      projectId: project.id,
      name: seed.name,
      aliases: seed.aliases,
      description: seed.description,
      part: seed.part,
      catalytic: seed.catalytic ?? false,
      referenceAlignmentId: null,
      preferredNumbering: null,
      sort,
      createdAt: unit.at,
      createdBy: unit.actorId,
    })),
  );
