import type { Issue } from '../../../shared/sequence/parse-result';
import type { Unit } from '../../db';
import type { MapQueries } from '../maps';
import { cappedIssues } from './capped-issues';
import { Upload } from './upload.entity';
import type { UploadQueries } from './upload.queries';

/** What became of a file that could be read. */
export interface UploadResult {
  state: 'waiting' | 'done';
  issues: readonly Issue[];
  alignmentId?: string;
  structureId?: string;
  revisionId: string;
}

/** received → reading → waiting → done, or refused. Each step is announced in the unit that takes it. */
export class UploadStates {
  constructor(
    private readonly queries: UploadQueries,
    private readonly maps: MapQueries,
  ) {}

  async begin(unit: Unit, uploadId: string): Promise<void> {
    const upload = await unit.manager.findOneByOrFail(Upload, { id: uploadId });
    if (upload.state === 'received') await this.step(unit, upload, { state: 'reading' });
  }

  /** The file keeps its row and its bytes; nothing else was written. */
  async refuse(unit: Unit, uploadId: string, issues: readonly Issue[]): Promise<void> {
    const upload = await unit.manager.findOneByOrFail(Upload, { id: uploadId });
    await this.step(unit, upload, { state: 'refused', issues: cappedIssues(issues) });
    await unit.audit({
      action: 'upload.refused',
      subjectKind: 'upload',
      subjectId: uploadId,
      after: { codes: [...new Set(issues.map((issue) => issue.code))].slice(0, 20) },
    });
  }

  async finish(unit: Unit, uploadId: string, { issues, ...result }: UploadResult): Promise<void> {
    const upload = await unit.manager.findOneByOrFail(Upload, { id: uploadId });
    await this.step(unit, upload, { ...result, issues: cappedIssues(issues) });
    await unit.audit({ action: 'upload.read', subjectKind: 'upload', subjectId: uploadId, after: result });
  }

  /** Done when no chain of the structure waits for a curator any more. */
  async settle(unit: Unit, structureRevisionId: string): Promise<void> {
    const upload = await unit.manager.findOneBy(Upload, {
      revisionId: structureRevisionId,
      state: 'waiting',
    });
    if (!upload) return;
    const waiting = await this.maps.waiting([structureRevisionId], unit.manager);
    if (!waiting.get(structureRevisionId)) await this.step(unit, upload, { state: 'done' });
  }

  private async step(unit: Unit, upload: Upload, change: Partial<Upload>): Promise<void> {
    await unit.manager.save(Object.assign(upload, change));
    unit.announce('upload.changed', upload.id, await this.queries.byId(upload.id, unit.manager));
  }
}
