import type { ChainMap, MapException } from '../../../shared/sequence/mapping/chain-types';
import type { MappedChain } from '../../modules/maps';

/** A chain has at most so many exceptions listed: one that fits nowhere has thousands. */
const exceptionsAtMost = 2000;

/** Differences that a curator need not look at before confirming. */
const expected = new Set<MapException['kind']>(['modified', 'tag']);

const inWords: Record<MapException['kind'], (exception: MapException) => string> = {
  mismatch: ({ chainLetter, proteinLetter }) => `${chainLetter} where the protein has ${proteinLetter}.`,
  engineered: ({ chainLetter, proteinLetter }) =>
    `${chainLetter} in place of ${proteinLetter}: changed on purpose, as the file says.`,
  modified: ({ chainLetter }) => `A modified ${chainLetter}.`,
  undetermined: () => 'One of the two letters is not determined.',
  ambiguous: () => 'Another alignment is just as good and pairs this residue otherwise.',
  tag: () => 'Outside the protein: a tag, or a longer end.',
  insertion: () => 'Inside the protein, but without a partner in it.',
};

/** A map of the core as it is stored and shown. */
export function describeMapping(map: ChainMap): MappedChain {
  return {
    identity: map.identity,
    coverage: map.coverage,
    segments: map.segments.map(({ chainStart, proteinStart, length }) => ({
      chainStart,
      proteinStart,
      length,
    })),
    exceptions: map.exceptions.slice(0, exceptionsAtMost).map((exception) => ({
      kind: exception.kind,
      label: exception.label,
      chainLetter: exception.chainLetter,
      residueIndex: exception.proteinIndex,
      proteinLetter: exception.proteinLetter,
      message: inWords[exception.kind](exception) + (exception.note ? ` File: ${exception.note}.` : ''),
    })),
    readiness: map.exceptions.every((exception) => expected.has(exception.kind)) ? 'ready' : 'look',
  };
}
