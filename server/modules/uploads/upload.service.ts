import type { z } from 'zod';
import type { newUploadBody, Upload as UploadContract } from '../../../shared/contracts';
import type { UnitOfWork } from '../../db';
import { StoredFile } from '../../db/entities';
import { newId } from '../../lib/new-id';
import { unusable } from '../../lib/problem';
import type { FileStore, ReceivedFile } from '../../storage';
import type { FamilyAccess } from '../families';
import type { ProjectAccess } from '../projects';
import { uploadJobKey, uploadJobKinds } from './upload-jobs';
import { Upload } from './upload.entity';
import type { UploadQueries } from './upload.queries';

const longestName = 120;

export class UploadService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly projects: ProjectAccess,
    private readonly families: FamilyAccess,
    private readonly files: FileStore,
    private readonly queries: UploadQueries,
    /** Told that there is a job to be done. */
    private readonly wakeJobs: () => void,
  ) {}

  async make(
    personId: string,
    projectId: string,
    body: z.infer<typeof newUploadBody>,
    file: ReceivedFile & { fileName: string },
  ): Promise<UploadContract> {
    await this.projects.may(personId, projectId, 'upload');
    const familyId = await this.familyOf(personId, projectId, body);
    // The bytes first: a row must never point to what is not there.
    await this.files.keep(file);
    const made = await this.unitOfWork.write({ projectId }, async (unit) => {
      await unit.manager
        .createQueryBuilder()
        .insert()
        .into(StoredFile)
        .values({
          hash: file.hash,
          bytes: String(file.bytes),
          media: 'application/octet-stream',
          createdAt: unit.at,
        })
        .orIgnore()
        .updateEntity(false)
        .execute();
      const upload = unit.manager.create(Upload, {
        id: newId(),
        projectId,
        kind: body.kind,
        familyId,
        name: body.name ?? nameFrom(file.fileName),
        fileHash: file.hash,
        fileName: file.fileName,
        state: 'received',
        issues: [],
        alignmentId: null,
        structureId: null,
        revisionId: null,
        createdAt: unit.at,
        createdBy: unit.actorId,
      });
      await unit.manager.insert(Upload, upload);
      await unit.enqueue({
        kind: uploadJobKinds[body.kind],
        subjectId: upload.id,
        payload: { uploadId: upload.id },
        dedupeKey: uploadJobKey(upload.id),
      });
      await unit.audit({
        action: 'upload.made',
        subjectKind: 'upload',
        subjectId: upload.id,
        after: { kind: upload.kind, fileName: upload.fileName, fileHash: upload.fileHash },
      });
      const presented = await this.queries.byId(upload.id, unit.manager);
      unit.announce('upload.changed', upload.id, presented);
      return presented;
    });
    this.wakeJobs();
    return made;
  }

  private async familyOf(
    personId: string,
    projectId: string,
    { kind, familyId }: z.infer<typeof newUploadBody>,
  ): Promise<string | null> {
    if (kind === 'structure') return null;
    if (familyId) return (await this.families.family(personId, projectId, familyId)).id;
    throw unusable('family-needed', 'An alignment belongs to a family. Say which one.', {
      fields: [{ path: 'familyId', message: 'Choose the family.' }],
    });
  }
}

/** `c_small.afa` names an alignment c_small. */
function nameFrom(fileName: string): string {
  const base = fileName.replace(/(\.(gz|[A-Za-z0-9]{1,8}))+$/, '').trim() || fileName;
  return [...base].slice(0, longestName).join('').trim();
}
