import { ALIGNMENT_LIMITS } from '@/shared/sequence/alignment/limits';
import { DEFAULT_STRUCTURE_LIMITS } from '@/shared/structure/limits';
import type { Upload } from '@/shared/contracts/uploads';

interface UploadLimit {
  bytes: number;
  title: string;
  /** What may be given, said before it is sent. */
  hint: string;
  accept: string;
}

const megabytes = (bytes: number): string => `${Math.floor(bytes / 1024 / 1024)} MB`;
const { maxBytes, maxRows, maxColumns } = ALIGNMENT_LIMITS;
const { bytes, chains, atoms } = DEFAULT_STRUCTURE_LIMITS;
const count = (value: number): string => value.toLocaleString('en').replaceAll(',', '\u00a0');

/** How much a reader takes on. A server may be set to take less, and says so. */
export const uploadLimits: Record<Upload['kind'], UploadLimit> = {
  alignment: {
    bytes: maxBytes,
    title: 'An aligned FASTA file of one family',
    hint: `Each row becomes a protein. Up to ${megabytes(maxBytes)}, ${count(maxRows)} rows of ${count(maxColumns)} columns.`,
    accept: '.afa,.fa,.fasta,.fas,.aln,.mfa,.txt',
  },
  structure: {
    bytes,
    title: 'A coordinate file in PDB format',
    hint: `Each protein chain is matched to the proteins of the project. Up to ${megabytes(bytes)}, ${count(chains)} chains, ${count(atoms)} atoms.`,
    accept: '.pdb,.ent,.txt',
  },
};

/** Why a file is not worth sending; null when it may go. */
export function whyNotSent(kind: Upload['kind'], file: { name: string; size: number }): string | null {
  if (file.size === 0) return `${file.name} is empty. Choose the file that holds the ${kind}.`;
  const { bytes: limit } = uploadLimits[kind];
  if (file.size <= limit) return null;
  return `${file.name} has ${megabytes(file.size)}, more than the ${megabytes(limit)} that are read. Send a smaller file.`;
}
