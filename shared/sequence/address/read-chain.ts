import type { AddressContext } from './types';

export interface ChainAddress {
  chainId: string;
  label: string;
  atom: string | null;
  how: 'exact' | 'other-case' | 'no-colon';
}

const CHAIN = /^([^\s:]{1,8}) ?: ?(-?)(\d{1,5})([A-Za-z]?)(?:[ .]([A-Z][A-Z0-9']{0,3}))?$/;
const WITHOUT_COLON = /^([A-Za-z])(\d{1,5})$/;

/** The chain id meant: as typed, else the one that differs in case alone. */
function findChain(
  typed: string,
  chainIds: readonly string[],
): { chainId: string; how: ChainAddress['how'] } | null {
  if (chainIds.includes(typed)) return { chainId: typed, how: 'exact' };
  const similar = chainIds.find((id) => id.toLowerCase() === typed.toLowerCase());
  return similar === undefined ? null : { chainId: similar, how: 'other-case' };
}

/** Whether the text has the form of a chain address, `K:59`, `AA:-4`, `7:52A CA`, known chain or not. */
export function hasChainForm(text: string): boolean {
  return CHAIN.test(text);
}

/** A chain and an author number; `a210` may leave out the colon, as people do in talk. Null: no such chain. */
export function readChainAddress(text: string, { chainIds }: AddressContext): ChainAddress | null {
  const full = CHAIN.exec(text);
  const short = full === null ? WITHOUT_COLON.exec(text) : null;
  const found = findChain(full?.[1] ?? short?.[1] ?? '', chainIds);
  if (found === null) return null;
  if (full === null) {
    return { chainId: found.chainId, label: String(Number(short?.[2])), atom: null, how: 'no-colon' };
  }
  const number = Number(full[3]);
  const label = `${full[2] !== '' && number !== 0 ? '-' : ''}${number}${full[4] ?? ''}`;
  return { ...found, label, atom: full[5] ?? null };
}
