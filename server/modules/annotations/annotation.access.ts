import type { UnitOfWork } from '../../db';
import { notFound } from '../../lib/problem';
import type { Membership, ProjectAccess } from '../projects';
import { Annotation } from './annotation.entity';

/** The only way to an annotation on someone's behalf. */
export class AnnotationAccess {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly projects: ProjectAccess,
  ) {}

  async seen(
    personId: string,
    projectId: string,
    annotationId: string,
  ): Promise<{ annotation: Annotation; membership: Membership }> {
    const membership = await this.projects.may(personId, projectId, 'read project');
    const annotation = await this.unitOfWork.reader.findOneBy(Annotation, { id: annotationId, projectId });
    if (!annotation) throw notFound('annotation');
    return { annotation, membership };
  }
}
