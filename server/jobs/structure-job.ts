import type { Issue } from '../../shared/sequence/parse-result';
import type { Unit } from '../db';
import type { ProteinDirectory } from '../modules/families';
import { addMaps } from '../modules/maps';
import { addStructure, type StructureQueries } from '../modules/structures';
import type { Upload } from '../modules/uploads';
import type { JobHandler } from './job-handler';
import { uploadJob, type UploadJobParts } from './upload-job';
import type { WorkerPool } from './worker-pool';
import type { StructureReading } from './workers/messages';

interface Parts extends UploadJobParts {
  pool: WorkerPool;
  proteins: ProteinDirectory;
  structures: StructureQueries;
}

type ReadStructure = NonNullable<StructureReading['value']>;

/** Reads an uploaded coordinate file and proposes for each protein chain which protein it is. */
export function readStructureJob(parts: Parts): JobHandler {
  const { pool, proteins, structures, states } = parts;

  async function candidates(projectId: string) {
    const texts = await proteins.ofProject(projectId);
    const families = await proteins.familiesByIds(texts.map((text) => text.familyId));
    return texts.map(({ id, familyId, organism, residues }) => ({
      id,
      name: `${families.get(familyId)?.name ?? ''} of ${organism}`,
      family: familyId,
      residues,
    }));
  }

  async function store(unit: Unit, upload: Upload, file: ReadStructure, issues: Issue[]): Promise<void> {
    const { structure, revision, chains } = await addStructure(unit, {
      projectId: upload.projectId,
      name: upload.name,
      fileHash: upload.fileHash,
      fileName: upload.fileName,
      format: file.format,
      title: file.title,
      modelCount: file.modelCount,
      atomCount: file.atomCount,
      issues,
      chains: file.chains.map((one) => one.chain),
    });
    const proposals = file.chains.flatMap(({ map }, at) => {
      const chain = chains[at];
      return map && chain ? [{ chainId: chain.id, map }] : [];
    });
    await addMaps(unit, proposals);
    unit.announce('structure.changed', structure.id, await structures.byId(structure.id, unit.manager));
    await states.finish(unit, upload.id, {
      state: proposals.length > 0 ? 'waiting' : 'done',
      issues,
      structureId: structure.id,
      revisionId: revision.id,
    });
  }

  return uploadJob<ReadStructure>(parts, {
    read: async (upload, file, signal, onProgress) =>
      pool.readStructure(file, await candidates(upload.projectId), signal, onProgress),
    store,
  });
}
