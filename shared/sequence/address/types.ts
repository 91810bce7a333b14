/** A family of the project, as an address may name it. */
export interface AddressFamily {
  /** As shown: `c`, `β`, `OSCP`. Case counts in names of one or two letters. */
  name: string;
  aliases: readonly string[];
}

/** What a project holds that an address can mean. */
export interface AddressContext {
  families: readonly AddressFamily[];
  /** Author ids of the chains of current structures. */
  chainIds: readonly string[];
}

/** One thing the typed text can mean, by its form alone: whether such a residue exists is asked elsewhere. */
export interface AddressReading {
  kind: 'family' | 'amino-acid' | 'number' | 'chain';
  /** Name of the family; null when any will do. */
  family: string | null;
  /** Chain id, only with kind `chain`. */
  chainId: string | null;
  /** One-letter code of the stated amino acid, upper case, or null. */
  letter: string | null;
  /** Label with sign and insertion letter: `59`, `-4`, `52A`. */
  label: string;
  /** One-letter code the residue is changed to (`*` stop, `X` any), or null. */
  mutationTo: string | null;
  /** Atom name after a chain address, or null. */
  atom: string | null;
  /** What stands after `@`, or null. */
  organism: string | null;
  /** What stands in braces, or null. */
  numbering: string | null;
  /** Heading of the readings of this form: `Family c, residue 62`. */
  group: string;
  /** Why the text can be read so. */
  reason: string;
  /** The spelling that leaves only this reading. */
  spelling: string;
}

export interface AddressResult {
  /** Most likely first; readings that need a changed letter come later. */
  readings: AddressReading[];
  /** What the text was not read as, and how to write it if that was meant. */
  notReadAs: string[];
}

/** Longest text looked at. */
export const MAX_ADDRESS_LENGTH = 200;
