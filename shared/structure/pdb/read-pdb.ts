import type { ParseResult } from '@/shared/sequence/parse-result';
import { assembleModel } from '../assemble-model';
import { IssueList } from '../issue-list';
import { DEFAULT_STRUCTURE_LIMITS, type StructureLimits } from '../limits';
import type { StructureModel } from '../types';
import { refuseContent } from './refuse-content';
import { PdbFile } from './pdb-file';

export interface ReadPdbOptions {
  /** Model to read, as numbered in the file; the first when left out. */
  model?: number;
  limits?: Partial<StructureLimits>;
}

/**
 * Reads a file in PDB format 3.3 (wwPDB, 2012) by column, in one pass: one model, chains in file order, each with its
 * polymer, ligands and waters, what the file declares of it, and one position for each atom (the alternate with the
 * highest occupancy, the first on ties). Lengths in ångström; lines and columns of issues count from 1; declared
 * indices from 0; labels as people read them.
 *
 * Never throws. Errors, with a null value: `empty`, `binary`, `wrong-kind`, `no-atoms`, `no-polymer`,
 * `model-not-found`, and `too-many-bytes`, `-atoms`, `-chains`, `-models`, `-header-rows` for what is over a limit.
 * Everything doubtful is a warning; at most `limits.issuesPerCode` of a kind are listed, the rest is counted.
 */
export function readPdb(bytes: Uint8Array, options: ReadPdbOptions = {}): ParseResult<StructureModel> {
  const limits = { ...DEFAULT_STRUCTURE_LIMITS, ...options.limits };
  const issues = new IssueList(limits.issuesPerCode);
  if (refuseContent(bytes, limits, issues)) return { value: null, issues: issues.toArray() };
  const draft = new PdbFile(bytes, options.model, limits, issues).read();
  const value = draft ? assembleModel(draft, limits.placementCells, issues) : null;
  return { value, issues: issues.toArray() };
}
