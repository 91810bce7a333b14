import { Entity, ForeignKey, Unique } from 'typeorm';
import { Exact, Ascii, Int, Json, Residues, Uuid, UuidPrimary } from '../../db/columns';

@Entity('chain')
@Unique(['revisionId', 'authorId'])
export class Chain {
  @UuidPrimary() id!: string;
  @ForeignKey('StructureRevision') @Uuid() revisionId!: string;
  /** Place of the chain in the file. */
  @Int() ordinal!: number;
  /** May be a blank; case counts. */
  @Exact(16) authorId!: string;
  @Json() labelIds!: string[];
  @Ascii(8) kind!: 'protein' | 'nucleic' | 'other';
  @Residues({ nullable: true }) declared!: string | null;
  /** One letter an observed residue, in file order: what `chain_index` counts. */
  @Residues() observed!: string;
  /** Index in the declared sequence of each observed residue, where known; runs of [chainStart, declaredStart, length]. */
  @Json() declaredRuns!: [number, number, number][];
  /** Author labels of declared residues without coordinates. */
  @Json() missing!: string[];
  /** Chain indices with alternate positions. */
  @Json() alternates!: number[];
  /** Modified residues: chain index and the three-letter parent. */
  @Json() modified!: [number, string][];
  /** What the file says of residues that differ from their database entry. */
  @Json() differences!: { label: string; comment: string }[];
}
