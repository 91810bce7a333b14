import type { MappableChain } from '../../../shared/sequence/mapping/chain-types';
import { writeLabel } from '../../../shared/sequence/numbering/label-text';
import type { Chain, ChainLabel } from '../structures';

/** A stored chain as the core maps it: one entry for each observed residue, in file order. */
export function mappableChain(chain: Chain, labels: readonly ChainLabel[]): MappableChain {
  const parents = new Map(chain.modified);
  const declared = new Map<number, number>();
  for (const [chainStart, declaredStart, length] of chain.declaredRuns)
    for (let k = 0; k < length; k += 1) declared.set(chainStart + k, declaredStart + k);
  const labelOf = new Map<number, string>();
  for (const { chainIndex, length, firstNumber, suffix } of labels)
    for (let k = 0; k < length; k += 1)
      labelOf.set(chainIndex + k, writeLabel({ number: firstNumber + k, suffix }));
  const residues = [...chain.observed].map((letter, index) => {
    const parent = parents.get(index);
    const declaredIndex = declared.get(index);
    return {
      label: labelOf.get(index) ?? '',
      letter,
      ...(parent === undefined ? {} : { parent }),
      ...(declaredIndex === undefined ? {} : { declaredIndex }),
    };
  });
  return { id: chain.authorId, residues, differences: chain.differences };
}
