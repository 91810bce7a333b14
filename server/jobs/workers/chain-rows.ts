import { segmentsOfLabels } from '../../../shared/sequence/numbering/numbering';
import type { Chain } from '../../../shared/structure/types';
import type { NewChain } from '../../modules/structures';

/** The columns of author labels take plain letters alone. */
const plain = (suffix: string) => suffix.replace(/[^\x20-\x7e]/g, '?').slice(0, 4);

/** A chain as it is stored: without atoms, its author numbers and its place in the declared sequence as runs. */
export function newChain(chain: Chain): NewChain {
  const labels = segmentsOfLabels(
    chain.residues.map(({ authorNumber, insertionCode }) => ({
      number: authorNumber,
      suffix: plain(insertionCode.trim()),
    })),
  );
  return {
    authorId: chain.id,
    labelIds: chain.labelIds,
    kind: chain.kind,
    declared: chain.declared,
    observed: chain.observed,
    declaredRuns: declaredRuns(chain),
    missing: chain.missing,
    alternates: chain.residues.flatMap((residue, index) => (residue.alternates > 0 ? [index] : [])),
    modified: chain.residues.flatMap(({ parent }, index): [number, string][] =>
      parent === undefined ? [] : [[index, parent]],
    ),
    differences: chain.differences.map(({ label, comment }) => ({ label, comment })),
    labels: labels.map(({ residueIndex, ...run }) => ({ chainIndex: residueIndex, ...run })),
  };
}

function declaredRuns(chain: Chain): [number, number, number][] {
  const runs: [number, number, number][] = [];
  chain.residues.forEach(({ declaredIndex }, index) => {
    if (declaredIndex === undefined) return;
    const open = runs.at(-1);
    if (open && open[0] + open[2] === index && open[1] + open[2] === declaredIndex) open[2] += 1;
    else runs.push([index, declaredIndex, 1]);
  });
  return runs;
}
