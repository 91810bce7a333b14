/** How much a coordinate file may hold before it is refused; every one can be set by the caller. */
export interface StructureLimits {
  bytes: number;
  atoms: number;
  chains: number;
  models: number;
  /** Rows of declared sequence, missing, modified and differing residues together. */
  headerEntries: number;
  /** Issues kept for each code; the rest is counted. */
  issuesPerCode: number;
  /** Cells of the tables that place observed residues in declared sequences, over the whole file. */
  placementCells: number;
}

export const DEFAULT_STRUCTURE_LIMITS: StructureLimits = {
  bytes: 256 * 1024 * 1024,
  atoms: 3_000_000,
  chains: 1_000,
  models: 10_000,
  headerEntries: 1_000_000,
  issuesPerCode: 20,
  placementCells: 60_000_000,
};
