import { In, type EntityManager } from 'typeorm';
import type {
  Annotation as AnnotationContract,
  AnnotationAtResidue,
  ResidueRef,
} from '../../../shared/contracts';
import type { UnitOfWork } from '../../db';
import type { PeopleDirectory } from '../auth';
import type { ProteinDirectory } from '../families';
import type { SiteQueries } from '../residues';
import { AnnotationVersion } from './annotation-version.entity';
import { Annotation } from './annotation.entity';
import { Pin } from './pin.entity';

export class AnnotationQueries {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly people: PeopleDirectory,
    private readonly proteins: ProteinDirectory,
    private readonly sites: SiteQueries,
  ) {}

  /** Whole objects, in the order given; the manager is that of the unit when called inside one. */
  async present(
    annotations: readonly Annotation[],
    manager: EntityManager = this.unitOfWork.reader,
  ): Promise<AnnotationContract[]> {
    const ids = annotations.map((annotation) => annotation.id);
    const [versions, pins] = await Promise.all([
      manager.findBy(AnnotationVersion, { annotationId: In(ids) }),
      manager.find(Pin, { where: { annotationId: In(ids) }, order: { annotationId: 'ASC', ordinal: 'ASC' } }),
    ]);
    const [labels, brief] = await Promise.all([
      this.proteins.presentLabels(pins),
      this.people.briefs([...annotations, ...versions].map((row) => row.createdBy)),
    ]);
    return annotations.map((annotation) => {
      const version = versions.find(
        (one) => one.annotationId === annotation.id && one.number === annotation.currentVersion,
      );
      if (!version) throw new Error(`Annotation ${annotation.id} has no current version.`);
      return {
        id: annotation.id,
        shape: annotation.shape,
        status: annotation.status,
        statusReason: annotation.statusReason,
        kind: version.kind,
        text: version.text,
        confidence: version.confidence,
        evidence: version.evidence,
        pins: pins.flatMap((pin, at) => {
          const label = labels[at];
          return pin.annotationId === annotation.id && label
            ? [{ ...label, structureId: pin.structureId, chains: pin.chains }]
            : [];
        }),
        versionNumber: annotation.currentVersion,
        by: brief(annotation.createdBy),
        at: annotation.createdAt.toISOString(),
        changedBy: brief(version.createdBy),
        changedAt: version.createdAt.toISOString(),
        version: annotation.version,
      };
    });
  }

  /** Annotations pinned on the residue itself first, then those on its equivalents, newest first. */
  async atResidue(projectId: string, ref: ResidueRef): Promise<AnnotationAtResidue[]> {
    const site = await this.sites.site(ref.proteinId, ref.residueIndex);
    const members = [ref, ...site.members];
    const placeholders = members.map(() => '(?, ?)').join(', ');
    const hits: { annotationId: string; proteinId: string; residueIndex: number }[] =
      await this.unitOfWork.reader.query(
        `SELECT annotation_id annotationId, protein_id proteinId, residue_index residueIndex FROM pin
        WHERE (protein_id, residue_index) IN (${placeholders})`,
        members.flatMap((member) => [member.proteinId, member.residueIndex]),
      );
    const annotations = await this.unitOfWork.reader.find(Annotation, {
      where: { id: In(hits.map((hit) => hit.annotationId)), projectId },
      order: { id: 'DESC' },
    });
    const presented = await this.present(annotations);
    const memberLabels = await this.proteins.presentLabels(site.members);
    return presented
      .map((annotation) => {
        const own = hits.filter((hit) => hit.annotationId === annotation.id);
        const isHere = own.some(
          (hit) => hit.proteinId === ref.proteinId && hit.residueIndex === ref.residueIndex,
        );
        const at = site.members.findIndex((member) =>
          own.some((hit) => hit.proteinId === member.proteinId && hit.residueIndex === member.residueIndex),
        );
        const residue = memberLabels[at];
        const grade = site.members[at]?.grade;
        return { ...annotation, viaEquivalence: isHere || !residue || !grade ? null : { residue, grade } };
      })
      .sort((one, other) => Number(one.viaEquivalence !== null) - Number(other.viaEquivalence !== null));
  }

  async list(projectId: string, before: string | undefined, limit: number) {
    const query = this.unitOfWork.reader
      .createQueryBuilder(Annotation, 'annotation')
      .where('annotation.projectId = :projectId', { projectId })
      .orderBy('annotation.id', 'DESC')
      .limit(limit + 1);
    if (before) query.andWhere('annotation.id < :before', { before });
    const rows = await query.getMany();
    const page = rows.slice(0, limit);
    return {
      annotations: await this.present(page),
      next: rows.length > limit ? (page.at(-1)?.id ?? null) : null,
    };
  }

  async versions(annotationId: string) {
    const rows = await this.unitOfWork.reader.find(AnnotationVersion, {
      where: { annotationId },
      order: { number: 'DESC' },
    });
    const brief = await this.people.briefs(rows.map((row) => row.createdBy));
    return rows.map(({ number, kind, text, confidence, evidence, createdBy, createdAt }) => ({
      number,
      kind,
      text,
      confidence,
      evidence,
      by: brief(createdBy),
      at: createdAt.toISOString(),
    }));
  }
}
