import type { Issue } from '../../../shared/sequence/parse-result';
import type { Unit } from '../../db';
import { insertMany } from '../../db/insert-many';
import { newId } from '../../lib/new-id';
import { AlignmentRevision } from './alignment-revision.entity';
import { AlignmentRow } from './alignment-row.entity';
import { AlignmentSegment } from './alignment-segment.entity';
import { Alignment } from './alignment.entity';

export interface NewAlignmentRow {
  name: string;
  proteinId: string;
  /** As in the file, gaps included. */
  text: string;
  segments: Pick<AlignmentSegment, 'columnStart' | 'proteinStart' | 'length'>[];
}

export interface NewAlignment {
  familyId: string;
  name: string;
  fileHash: string;
  fileName: string;
  format: string;
  columnCount: number;
  issues: Issue[];
  rows: readonly NewAlignmentRow[];
}

/** Writes an alignment with its first revision, its rows and their ungapped runs. */
export async function addAlignment(
  unit: Unit,
  { familyId, name, rows, ...file }: NewAlignment,
): Promise<{ alignment: Alignment; revision: AlignmentRevision }> {
  const made = { createdAt: unit.at, createdBy: unit.actorId };
  const alignment = unit.manager.create(Alignment, {
    id: newId(),
    familyId,
    name,
    currentRevisionId: null,
    ...made,
  });
  const revision = unit.manager.create(AlignmentRevision, {
    id: newId(),
    alignmentId: alignment.id,
    revision: 1,
    ...file,
    rowCount: rows.length,
    status: 'current',
    ...made,
  });
  alignment.currentRevisionId = revision.id;
  await unit.manager.insert(Alignment, alignment);
  await unit.manager.insert(AlignmentRevision, revision);
  const place = (rowIndex: number) => ({ revisionId: revision.id, rowIndex });
  await insertMany(
    unit.manager,
    AlignmentRow,
    rows.map(({ name: rowName, proteinId, text }, at) => ({ ...place(at), name: rowName, proteinId, text })),
  );
  await insertMany(
    unit.manager,
    AlignmentSegment,
    rows.flatMap(({ segments }, at) => segments.map((segment) => ({ ...place(at), ...segment }))),
  );
  return { alignment, revision };
}
