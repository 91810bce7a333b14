import { codeOfLetter } from '../sequence/alphabet';
import { residueIndex } from '../sequence/positions';
import { writePdb, type PdbWriteChain } from '../structure/pdb/write-pdb';
import type { BackboneResidue } from './backbone';
import { matureA } from './numberings.data';
import { modelOrganism } from './organisms.data';
import type {
  ScenarioAlignment,
  ScenarioChain,
  ScenarioFamily,
  ScenarioStructure,
  Xyz,
} from './scenario-types';
import { buildChain, moveResidue } from './stand';
import {
  bundlePlan,
  hairpinPlan,
  lie,
  ringChainIds,
  statorChainId,
  stepDegrees,
} from './structure-plan.data';
import type { ChainPlan } from './structure-plan.data';
import { add, turn } from './vectors';

/** A chain with the coordinates of its observed residues by residue index. */
export interface ModelChain {
  truth: ScenarioChain;
  coordinates: Map<number, BackboneResidue>;
}

const fileName = 'ring-and-stator-model.pdb';
const title = 'INVENTED MODEL OF A TEN-RING MOTOR, ORVELLA TARDA, COMPUTED FROM IDEAL GEOMETRY';
const remarks = [
  'INVENTED DATA. ORGANISM, SEQUENCES AND COORDINATES ARE MADE UP; NOTHING HERE WAS MEASURED.',
  'CHAIN A COUNTS THE MATURE CHAIN, WITHOUT A LEADER OF EIGHT RESIDUES.',
];
const atomNames = ['N', 'CA', 'C', 'O', 'CB'] as const;
const zAxis: Xyz = [0, 0, 1];

/** A ring of ten c hairpins beside one a subunit, from ideal geometry; the same for every seed but for its residues. */
export function makeModel(alignments: ScenarioAlignment[]): ModelChain[] {
  const hairpin = buildChain(hairpinPlan);
  const ring = ringChainIds.map((id, step) => {
    const angle = step * stepDegrees;
    const turned = moveChain(hairpin, (point) => turn(point, zAxis, angle));
    return modelChain(id, 'c', alignments, hairpinPlan, turned, 0, { copy: step + 1, angle });
  });
  const stator = buildChain(bundlePlan);
  return [modelChain(statorChainId, 'a', alignments, bundlePlan, stator, matureA.offset, null), ...ring];
}

/** The model as a PDB-format file with its truth. */
export function makeStructure(model: ModelChain[]): ScenarioStructure {
  const { value } = writePdb({ title, remarks, chains: model.map(pdbChain) });
  return {
    fileName,
    title,
    text: value ?? '',
    chains: model.map((chain) => chain.truth),
    axis: { direction: layDirection(zAxis), point: lie.moveAngstrom },
  };
}

function modelChain(
  id: string,
  family: ScenarioFamily,
  alignments: ScenarioAlignment[],
  plan: ChainPlan,
  standing: Map<number, BackboneResidue>,
  offset: number,
  ring: { copy: number; angle: number } | null,
): ModelChain {
  const rows = alignments.find((alignment) => alignment.family === family)?.rows ?? [];
  const letters = rows.find((row) => row.organism === modelOrganism)?.residues ?? '';
  const residues = Array.from({ length: plan.to - plan.from + 1 }, (_, step) => {
    const index = plan.from + step;
    return {
      index: residueIndex(index),
      authorNumber: index + 1 + offset,
      letter: letters.charAt(index),
      observed: standing.has(index),
    };
  });
  const truth: ScenarioChain = {
    id,
    family,
    organism: modelOrganism,
    copy: ring?.copy ?? null,
    angleDegrees: ring?.angle ?? null,
    residues,
  };
  return { truth, coordinates: moveChain(standing, (point) => add(layDirection(point), lie.moveAngstrom)) };
}

function moveChain(chain: Map<number, BackboneResidue>, move: (point: Xyz) => Xyz) {
  return new Map([...chain].map(([index, residue]) => [index, moveResidue(residue, move)]));
}

function layDirection(point: Xyz): Xyz {
  return turn(turn(point, [1, 0, 0], lie.tiltDegrees), zAxis, lie.turnDegrees);
}

function pdbChain({ truth, coordinates }: ModelChain): PdbWriteChain {
  const name = (letter: string) => codeOfLetter(letter).toUpperCase();
  const residues = truth.residues.flatMap((residue) => {
    const placed = coordinates.get(residue.index);
    if (!placed) return [];
    const atoms = atomNames
      .filter((atom) => atom !== 'CB' || residue.letter !== 'G')
      .map((atom) => {
        const [x, y, z] = placed[atom];
        return { name: atom, element: atom.charAt(0), x, y, z };
      });
    return [{ number: residue.authorNumber, name: name(residue.letter), atoms }];
  });
  const missing = truth.residues
    .filter((residue) => !residue.observed)
    .map((residue) => ({ number: residue.authorNumber, name: name(residue.letter) }));
  return {
    id: truth.id,
    declared: truth.residues.map((residue) => name(residue.letter)),
    residues,
    missing,
  };
}
