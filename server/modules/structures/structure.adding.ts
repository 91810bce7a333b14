import type { Issue } from '../../../shared/sequence/parse-result';
import type { Unit } from '../../db';
import { insertMany } from '../../db/insert-many';
import { newId } from '../../lib/new-id';
import { ChainLabel } from './chain-label.entity';
import { Chain } from './chain.entity';
import { StructureRevision } from './structure-revision.entity';
import { Structure } from './structure.entity';

export type NewChain = Pick<
  Chain,
  | 'authorId'
  | 'labelIds'
  | 'kind'
  | 'declared'
  | 'observed'
  | 'declaredRuns'
  | 'missing'
  | 'alternates'
  | 'modified'
  | 'differences'
> & { labels: Pick<ChainLabel, 'chainIndex' | 'length' | 'firstNumber' | 'suffix'>[] };

export interface NewStructure {
  projectId: string;
  name: string;
  fileHash: string;
  fileName: string;
  format: string;
  title: string;
  modelCount: number;
  atomCount: number;
  issues: Issue[];
  chains: readonly NewChain[];
}

const longestTitle = 500;

/** Writes a structure with its first revision, its chains and their author numbers. */
export async function addStructure(
  unit: Unit,
  { projectId, name, title, chains, ...file }: NewStructure,
): Promise<{ structure: Structure; revision: StructureRevision; chains: Chain[] }> {
  const made = { createdAt: unit.at, createdBy: unit.actorId };
  const structure = unit.manager.create(Structure, {
    id: newId(),
    projectId,
    name,
    currentRevisionId: null,
    ...made,
  });
  const revision = unit.manager.create(StructureRevision, {
    id: newId(),
    structureId: structure.id,
    revision: 1,
    ...file,
    title: [...title].slice(0, longestTitle).join(''),
    chainCount: chains.length,
    status: 'current',
    ...made,
  });
  structure.currentRevisionId = revision.id;
  await unit.manager.insert(Structure, structure);
  await unit.manager.insert(StructureRevision, revision);
  const rows = chains.map(({ labels: _, ...chain }, ordinal) =>
    unit.manager.create(Chain, { id: newId(), revisionId: revision.id, ordinal, ...chain }),
  );
  await insertMany(unit.manager, Chain, rows);
  await insertMany(
    unit.manager,
    ChainLabel,
    chains.flatMap(({ labels }, at) => labels.map((label) => ({ chainId: rows[at]?.id ?? '', ...label }))),
  );
  return { structure, revision, chains: rows };
}
