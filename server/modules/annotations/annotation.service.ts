import type { z } from 'zod';
import {
  actOfAnnotationStatus,
  type Annotation as AnnotationContract,
  type annotationStatusBody,
  type editAnnotationBody,
  type newAnnotationBody,
} from '../../../shared/contracts';
import type { Unit, UnitOfWork } from '../../db';
import { newId } from '../../lib/new-id';
import { stale, unusable } from '../../lib/problem';
import type { ProteinDirectory } from '../families';
import type { ProjectAccess } from '../projects';
import type { AnnotationAccess } from './annotation.access';
import { AnnotationVersion } from './annotation-version.entity';
import { Annotation } from './annotation.entity';
import { checkStatusStep, shapeOf } from './annotation.policy';
import type { AnnotationQueries } from './annotation.queries';
import { checkCopies } from './pin.copies';
import { Pin } from './pin.entity';

type Content = z.infer<typeof editAnnotationBody>;

export class AnnotationService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly projects: ProjectAccess,
    private readonly access: AnnotationAccess,
    private readonly proteins: ProteinDirectory,
    private readonly queries: AnnotationQueries,
  ) {}

  async make(
    personId: string,
    projectId: string,
    body: z.infer<typeof newAnnotationBody>,
  ): Promise<AnnotationContract> {
    await this.projects.may(personId, projectId, 'annotate');
    await this.proteins.mustHoldResidues(projectId, body.pins);
    await checkCopies(this.unitOfWork, projectId, body.pins);
    const places = body.pins.map((pin) => `${pin.proteinId}:${pin.residueIndex}`);
    if (new Set(places).size < places.length) {
      throw unusable('pinned-twice', 'The same residue is named twice. Name each residue once.');
    }
    return this.unitOfWork.write({ projectId, actorId: personId }, async (unit) => {
      const annotation = unit.manager.create(Annotation, {
        id: newId(),
        projectId,
        shape: shapeOf(body.pins.length),
        status: 'proposed',
        statusReason: '',
        currentVersion: 1,
        createdAt: unit.at,
        createdBy: personId,
      });
      await unit.manager.save(annotation);
      await unit.manager.insert(
        Pin,
        body.pins.map((pin, ordinal) => ({
          annotationId: annotation.id,
          ordinal,
          proteinId: pin.proteinId,
          residueIndex: pin.residueIndex,
          structureId: pin.structureId ?? null,
          chains: pin.chains?.length ? pin.chains : null,
        })),
      );
      await this.addVersion(unit, annotation.id, 1, body);
      return this.finish(unit, annotation, 'annotation.made', null, body);
    });
  }

  async edit(personId: string, projectId: string, annotationId: string, version: number, content: Content) {
    const { annotation: seen } = await this.access.seen(personId, projectId, annotationId);
    await this.projects.may(personId, projectId, 'edit annotation', { own: seen.createdBy === personId });
    return this.unitOfWork.write({ projectId }, async (unit) => {
      const annotation = await this.current(unit, annotationId, version);
      const before = await unit.manager.findOneByOrFail(AnnotationVersion, {
        annotationId,
        number: annotation.currentVersion,
      });
      annotation.currentVersion += 1;
      await unit.manager.save(annotation);
      await this.addVersion(unit, annotationId, annotation.currentVersion, content);
      const { kind, text, confidence, evidence } = before;
      return this.finish(
        unit,
        annotation,
        'annotation.edited',
        { kind, text, confidence, evidence },
        content,
      );
    });
  }

  async setStatus(
    personId: string,
    projectId: string,
    annotationId: string,
    version: number,
    { status, reason }: z.infer<typeof annotationStatusBody>,
  ) {
    const { annotation: seen } = await this.access.seen(personId, projectId, annotationId);
    await this.projects.may(personId, projectId, actOfAnnotationStatus[status], {
      own: seen.createdBy === personId,
    });
    return this.unitOfWork.write({ projectId }, async (unit) => {
      const annotation = await this.current(unit, annotationId, version);
      checkStatusStep(annotation.status, status, reason);
      const before = { status: annotation.status, reason: annotation.statusReason };
      await unit.manager.save(Object.assign(annotation, { status, statusReason: reason }));
      return this.finish(unit, annotation, `annotation.${status}`, before, { status, reason });
    });
  }

  private async current(unit: Unit, annotationId: string, version: number): Promise<Annotation> {
    const annotation = await unit.manager.findOneByOrFail(Annotation, { id: annotationId });
    if (annotation.version !== version)
      throw stale((await this.queries.present([annotation], unit.manager))[0]);
    return annotation;
  }

  private async addVersion(
    unit: Unit,
    annotationId: string,
    number: number,
    content: Content,
  ): Promise<void> {
    const { kind, text, confidence, evidence } = content;
    const made = { createdAt: unit.at, createdBy: unit.actorId };
    await unit.manager.insert(AnnotationVersion, {
      annotationId,
      number,
      kind,
      text,
      confidence,
      evidence,
      ...made,
    });
  }

  private async finish(unit: Unit, annotation: Annotation, action: string, before: unknown, after: unknown) {
    const [presented] = await this.queries.present([annotation], unit.manager);
    if (!presented) throw new Error('The annotation just written cannot be read.');
    await unit.audit({ action, subjectKind: 'annotation', subjectId: annotation.id, before, after });
    unit.announce('annotation.changed', annotation.id, presented);
    return presented;
  }
}
