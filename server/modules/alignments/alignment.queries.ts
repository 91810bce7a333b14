import { In, type EntityManager } from 'typeorm';
import type { z } from 'zod';
import type { Alignment as AlignmentContract, alignmentRow } from '../../../shared/contracts';
import type { UnitOfWork } from '../../db';
import { notFound } from '../../lib/problem';
import type { PeopleDirectory } from '../auth';
import { Family, type ProteinDirectory } from '../families';
import { AlignmentRevision } from './alignment-revision.entity';
import { AlignmentRow } from './alignment-row.entity';
import { Alignment } from './alignment.entity';

/** Alignments in their current revision. The manager is that of the unit when called inside one. */
export class AlignmentQueries {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly people: PeopleDirectory,
    private readonly proteins: ProteinDirectory,
  ) {}

  async ofProject(projectId: string): Promise<AlignmentContract[]> {
    const reader = this.unitOfWork.reader;
    const families = await reader.find(Family, { select: { id: true }, where: { projectId } });
    const alignments = await reader.find(Alignment, {
      where: { familyId: In(families.map((family) => family.id)) },
      order: { id: 'DESC' },
    });
    return this.present(alignments, reader);
  }

  /** An alignment of the project, with its rows. */
  async withRows(
    projectId: string,
    alignmentId: string,
  ): Promise<AlignmentContract & { rows: z.infer<typeof alignmentRow>[] }> {
    const reader = this.unitOfWork.reader;
    const alignment = await reader.findOneBy(Alignment, { id: alignmentId });
    const family = alignment && (await reader.findOneBy(Family, { id: alignment.familyId, projectId }));
    const [presented] = family ? await this.present([alignment], reader) : [];
    if (!presented) throw notFound('alignment');
    const rows = await reader.find(AlignmentRow, {
      where: { revisionId: presented.revisionId },
      order: { rowIndex: 'ASC' },
    });
    const proteins = await this.proteins.byIds(rows.map((row) => row.proteinId));
    return {
      ...presented,
      rows: rows.map(({ rowIndex, name, proteinId, text }) => ({
        rowIndex,
        name,
        proteinId,
        organism: proteins.get(proteinId)?.organism ?? '',
        text,
      })),
    };
  }

  async byId(alignmentId: string, manager: EntityManager): Promise<AlignmentContract> {
    const alignment = await manager.findOneByOrFail(Alignment, { id: alignmentId });
    const [presented] = await this.present([alignment], manager);
    if (!presented) throw new Error(`Alignment ${alignmentId} has no current revision.`);
    return presented;
  }

  private async present(
    alignments: readonly Alignment[],
    manager: EntityManager,
  ): Promise<AlignmentContract[]> {
    const revisions = await manager.findBy(AlignmentRevision, {
      id: In(alignments.flatMap((alignment) => alignment.currentRevisionId ?? [])),
    });
    const families = await this.proteins.familiesByIds(
      alignments.map((alignment) => alignment.familyId),
      manager,
    );
    const brief = await this.people.briefs(revisions.map((revision) => revision.createdBy));
    const byId = new Map(revisions.map((revision) => [revision.id, revision]));
    return alignments.flatMap((alignment) => {
      const revision = byId.get(alignment.currentRevisionId ?? '');
      if (!revision) return [];
      const { format, rowCount, columnCount, fileName, issues } = revision;
      return [
        {
          id: alignment.id,
          familyId: alignment.familyId,
          name: alignment.name,
          isReference: families.get(alignment.familyId)?.referenceAlignmentId === alignment.id,
          revisionId: revision.id,
          revision: revision.revision,
          format,
          rowCount,
          columnCount,
          fileName,
          issues,
          by: brief(revision.createdBy),
          at: revision.createdAt.toISOString(),
          version: alignment.version,
        },
      ];
    });
  }
}
