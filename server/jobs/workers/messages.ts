import type { Alignment } from '../../../shared/sequence/alignment/types';
import type { Issue } from '../../../shared/sequence/parse-result';
import type { NewMap } from '../../modules/maps';
import type { NewChain } from '../../modules/structures';

/** Told on the way: `read` while the file is read, `map` while its chains are matched. */
export interface WorkerProgress {
  stage: 'read' | 'map';
  done: number;
  total: number;
}

export type ReadRow = Pick<
  Alignment['rows'][number],
  'name' | 'text' | 'residues' | 'segments' | 'firstNumber'
>;

export interface AlignmentReading {
  value: { format: string; columnCount: number; rows: ReadRow[] } | null;
  issues: Issue[];
}

export interface StructureReading {
  value: {
    format: string;
    title: string;
    modelCount: number;
    atomCount: number;
    /** In the order of the file; `map` is null for a chain that is not a protein. */
    chains: { chain: NewChain; map: NewMap | null }[];
  } | null;
  issues: Issue[];
}
