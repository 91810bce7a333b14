import { addAlignment, type AlignmentQueries } from '../modules/alignments';
import { addProteins, type FamilyService } from '../modules/families';
import type { Unit } from '../db';
import type { Issue } from '../../shared/sequence/parse-result';
import type { Upload } from '../modules/uploads';
import type { JobHandler } from './job-handler';
import { uploadJob, type UploadJobParts } from './upload-job';
import type { WorkerPool } from './worker-pool';
import type { AlignmentReading, ReadRow } from './workers/messages';

interface Parts extends UploadJobParts {
  pool: WorkerPool;
  families: FamilyService;
  alignments: AlignmentQueries;
}

type ReadAlignment = NonNullable<AlignmentReading['value']>;

/** Reads an uploaded alignment: each row becomes a protein of the family, or is one already. */
export function readAlignmentJob(parts: Parts): JobHandler {
  const { pool, families, alignments, states } = parts;

  async function store(unit: Unit, upload: Upload, file: ReadAlignment, issues: Issue[]): Promise<void> {
    const familyId = upload.familyId;
    if (!familyId) throw new Error(`Upload ${upload.id} of an alignment has no family.`);
    const { ids } = await addProteins(
      unit,
      { id: familyId, projectId: upload.projectId },
      file.rows.map(protein),
    );
    const { alignment, revision } = await addAlignment(unit, {
      familyId,
      name: upload.name,
      fileHash: upload.fileHash,
      fileName: upload.fileName,
      format: file.format,
      columnCount: file.columnCount,
      issues,
      rows: file.rows.map(({ name, text, segments }, at) => ({
        name,
        text,
        segments,
        proteinId: ids[at] ?? '',
      })),
    });
    await families.setReferenceIfNone(unit, familyId, alignment.id);
    unit.announce('alignment.changed', alignment.id, await alignments.byId(alignment.id, unit.manager));
    await states.finish(unit, upload.id, {
      state: 'done',
      issues,
      alignmentId: alignment.id,
      revisionId: revision.id,
    });
  }

  return uploadJob<ReadAlignment>(parts, {
    read: (_upload, file, signal, onProgress) => pool.readAlignment(file, signal, onProgress),
    store,
  });
}

/** A Latin binomial has its blank as an underscore in a row name, which ends at the first blank. */
const binomial = /^[A-Z][a-z]+_[a-z]+$/;

/** The organism is at first the row's name, without a range of residues at its end. */
function protein({ name, residues, firstNumber }: ReadRow) {
  const plain = firstNumber === undefined ? name : name.replace(/\/\d+-\d+$/, '');
  const organism = binomial.test(plain) ? plain.replace('_', ' ') : plain;
  return { name, organism, residues, ...(firstNumber === undefined ? {} : { firstNumber }) };
}
