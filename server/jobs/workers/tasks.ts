import { readFileSync } from 'node:fs';
import type { MessagePort } from 'node:worker_threads';
import { readAlignment } from '../../../shared/sequence/alignment/read-alignment';
import { mapChainTo } from '../../../shared/sequence/mapping/map-chain';
import type { CandidateProtein, MappableChain } from '../../../shared/sequence/mapping/chain-types';
import { readPdb } from '../../../shared/structure/pdb/read-pdb';
import type { MappedChain } from '../../modules/maps';
import { newChain } from './chain-rows';
import { describeMapping } from './map-rows';
import { proposeMaps } from './propose-maps';
import type { AlignmentReading, StructureReading, WorkerProgress } from './messages';

/** What runs in a worker thread. Bytes are read here, so that they never lie in the memory of the server's own thread. */

const tell = (port: MessagePort) => (progress: WorkerProgress) => port.postMessage(progress);

export function readAlignmentFile({ file, port }: { file: string; port: MessagePort }): AlignmentReading {
  tell(port)({ stage: 'read', done: 0, total: 1 });
  const { value, issues } = readAlignment(readFileSync(file));
  if (!value) return { value, issues };
  const rows = value.rows.map(({ name, text, residues, segments, firstNumber }) => ({
    name,
    text,
    residues,
    segments,
    ...(firstNumber === undefined ? {} : { firstNumber }),
  }));
  return { value: { format: value.format, columnCount: value.columnCount, rows }, issues };
}

interface StructureTask {
  file: string;
  candidates: CandidateProtein[];
  port: MessagePort;
}

export function readStructureFile({ file, candidates, port }: StructureTask): StructureReading {
  tell(port)({ stage: 'read', done: 0, total: 1 });
  const { value, issues } = readPdb(readFileSync(file));
  if (!value) return { value, issues };
  const maps = proposeMaps(value.chains, candidates, tell(port));
  const { format, title, modelCount, atoms } = value;
  return {
    value: {
      format,
      title,
      modelCount,
      atomCount: atoms.count,
      chains: value.chains.map((chain) => ({ chain: newChain(chain), map: maps.get(chain.id) ?? null })),
    },
    issues,
  };
}

export function mapOneChain({
  chain,
  protein,
}: {
  chain: MappableChain;
  protein: CandidateProtein;
}): MappedChain | null {
  const map = mapChainTo(chain, protein);
  return map && describeMapping(map);
}
