import type { ModelChain } from './model';
import { matureA } from './numberings.data';
import { organisms } from './organisms.data';
import type { ScenarioAlignment } from './scenario-types';
import { statorChainId } from './structure-plan.data';
import { residueAtSite } from './truth';
import { distance } from './vectors';

/** Facts of the generated data that the story tells, by name. */
export function gatherFacts(alignments: ScenarioAlignment[], model: ModelChain[]): Map<string, string> {
  const carboxylate = residueAtSite(alignments, 'c', 'carboxylate')?.index ?? -1;
  const arginine = residueAtSite(alignments, 'a', 'essential arginine')?.index ?? -1;
  const acid = residueAtSite(alignments, 'a', 'n-side acid')?.index ?? -1;
  const stator = model.find((chain) => chain.truth.id === statorChainId);
  const [nearest, second] = copiesByDistance(model, stator, carboxylate, arginine);
  const c = alignments.find((alignment) => alignment.family === 'c');
  const column = c?.sites.carboxylate ?? -1;
  const rowsWith = (letter: string) =>
    c?.rows.filter((row) => row.text.charAt(column) === letter).length ?? 0;
  const gap = innerGap(stator);
  const facts: Record<string, string | number | undefined> = {
    organisms: organisms.length,
    'rows with E': rowsWith('E'),
    'rows with D': rowsWith('D'),
    'rows with Q': rowsWith('Q'),
    'nearest copy distance': nearest?.distanceAngstrom.toFixed(1),
    'second copy chain': second?.id,
    'second copy distance': second?.distanceAngstrom.toFixed(1),
    'carboxylate author number': authorNumber(nearest?.chain, carboxylate),
    'arginine author number': authorNumber(stator, arginine),
    'acid before arginine': arginine - acid,
    'leader length': -matureA.offset,
    'gap first': gap[0],
    'gap last': gap.at(-1),
  };
  return new Map(Object.entries(facts).map(([name, value]) => [name, String(value)]));
}

function copiesByDistance(
  model: ModelChain[],
  stator: ModelChain | undefined,
  carboxylate: number,
  arginine: number,
): { id: string; chain: ModelChain; distanceAngstrom: number }[] {
  const facing = stator?.coordinates.get(arginine)?.CB;
  return model
    .flatMap((chain) => {
      const own = chain.truth.copy === null ? undefined : chain.coordinates.get(carboxylate)?.CB;
      return own && facing ? [{ id: chain.truth.id, chain, distanceAngstrom: distance(own, facing) }] : [];
    })
    .sort((a, b) => a.distanceAngstrom - b.distanceAngstrom);
}

function authorNumber(chain: ModelChain | undefined, index: number): number | undefined {
  return chain?.truth.residues.find((residue) => residue.index === index)?.authorNumber;
}

/** Author numbers of the residues that are not seen between two that are. */
function innerGap(chain: ModelChain | undefined): number[] {
  const residues = chain?.truth.residues ?? [];
  const first = residues.findIndex((residue) => residue.observed);
  const last = residues.map((residue) => residue.observed).lastIndexOf(true);
  return residues
    .slice(Math.max(first, 0), last + 1)
    .filter((residue) => !residue.observed)
    .map((residue) => residue.authorNumber);
}
