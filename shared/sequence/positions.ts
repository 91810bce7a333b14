declare const brand: unique symbol;
type Branded<Name extends string> = number & { readonly [brand]: Name };

/** Place of a residue in a protein's ungapped sequence, from 0. */
export type ResidueIndex = Branded<'ResidueIndex'>;
/** Place of a column in an alignment, from 0. */
export type ColumnIndex = Branded<'ColumnIndex'>;
/** Place of an observed residue in a chain, in file order, from 0. */
export type ChainIndex = Branded<'ChainIndex'>;
/** Place of a base in a construct's DNA, from 0. */
export type BaseIndex = Branded<'BaseIndex'>;

export const residueIndex = (value: number): ResidueIndex => value as ResidueIndex;
export const columnIndex = (value: number): ColumnIndex => value as ColumnIndex;
export const chainIndex = (value: number): ChainIndex => value as ChainIndex;
export const baseIndex = (value: number): BaseIndex => value as BaseIndex;
