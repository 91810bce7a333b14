import { In, type EntityManager } from 'typeorm';
import type { Upload as UploadContract } from '../../../shared/contracts';
import type { UnitOfWork } from '../../db';
import { Job, StoredFile } from '../../db/entities';
import { notFound } from '../../lib/problem';
import { readExcerpt, type Excerpt, type FileStore } from '../../storage';
import type { PeopleDirectory } from '../auth';
import { Upload } from './upload.entity';
import { uploadJobKey } from './upload-jobs';

const listedAtMost = 200;

/** Uploads as contracts. The manager is that of the unit when called inside one. */
export class UploadQueries {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly people: PeopleDirectory,
    private readonly files: FileStore,
  ) {}

  /** The newest first. */
  async ofProject(projectId: string): Promise<UploadContract[]> {
    const uploads = await this.unitOfWork.reader.find(Upload, {
      where: { projectId },
      order: { id: 'DESC' },
      take: listedAtMost,
    });
    return this.present(uploads);
  }

  async read(projectId: string, uploadId: string): Promise<UploadContract> {
    const [presented] = await this.present([await this.row(projectId, uploadId)]);
    if (!presented) throw notFound('upload');
    return presented;
  }

  async byId(uploadId: string, manager: EntityManager): Promise<UploadContract> {
    const upload = await manager.findOneByOrFail(Upload, { id: uploadId });
    const [presented] = await this.present([upload], manager);
    if (!presented) throw new Error(`Upload ${uploadId} cannot be presented.`);
    return presented;
  }

  async excerpt(projectId: string, uploadId: string, line: number, column?: number): Promise<Excerpt> {
    const upload = await this.row(projectId, uploadId);
    return readExcerpt(this.files.pathOf(upload.fileHash), line, { column });
  }

  private async row(projectId: string, uploadId: string): Promise<Upload> {
    const upload = await this.unitOfWork.reader.findOneBy(Upload, { id: uploadId, projectId });
    if (!upload) throw notFound('upload');
    return upload;
  }

  private async present(
    uploads: readonly Upload[],
    manager: EntityManager = this.unitOfWork.reader,
  ): Promise<UploadContract[]> {
    const files = await manager.findBy(StoredFile, { hash: In(uploads.map((upload) => upload.fileHash)) });
    const running = uploads.filter((upload) => upload.state === 'reading');
    const jobs = await manager.findBy(Job, {
      dedupeKey: In(running.map((upload) => uploadJobKey(upload.id))),
    });
    const brief = await this.people.briefs(uploads.map((upload) => upload.createdBy));
    const bytesOf = new Map(files.map((file) => [file.hash, Number(file.bytes)]));
    const jobOf = new Map(jobs.map((job) => [job.dedupeKey, job]));
    return uploads.map((upload) => {
      const job = jobOf.get(uploadJobKey(upload.id));
      const { id, kind, fileName, familyId, state, issues, alignmentId, structureId, version } = upload;
      return {
        id,
        kind,
        fileName,
        bytes: bytesOf.get(upload.fileHash) ?? 0,
        familyId,
        state,
        stage: job?.stage ?? '',
        done: job?.done ?? 0,
        total: job?.total ?? 0,
        issues,
        alignmentId,
        structureId,
        by: brief(upload.createdBy),
        at: upload.createdAt.toISOString(),
        version,
      };
    });
  }
}
