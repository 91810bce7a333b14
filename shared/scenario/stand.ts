import { buildBackbone, helixTorsions, type BackboneResidue, type Torsions } from './backbone';
import type { Xyz } from './scenario-types';
import type { ChainPlan, Piece, Stand } from './structure-plan.data';
import { add, cross, dot, scale, subtract, turn, unit } from './vectors';

const upward: Xyz = [0, 0, 1];
/** Distance of Cα from the axis of an ideal helix, from its rise, its turn and Cα–Cα 3.81 Å. */
const helixRadiusAngstrom = 2.29;

/** Coordinates by residue index of the observed residues of one chain, ring axis on z. */
export function buildChain(plan: ChainPlan): Map<number, BackboneResidue> {
  const placed = new Map<number, BackboneResidue>();
  for (const piece of plan.pieces) {
    standUp(buildBackbone(pieceTorsions(piece)), piece).forEach((residue, step) => {
      placed.set(piece.from + step, residue);
    });
  }
  return placed;
}

/** Moves every atom of a residue alike. */
export function moveResidue(residue: BackboneResidue, move: (point: Xyz) => Xyz): BackboneResidue {
  const { N, CA, C, O, CB } = residue;
  return { N: move(N), CA: move(CA), C: move(C), O: move(O), CB: move(CB) };
}

function pieceTorsions(piece: Piece): Torsions[] {
  const torsions = Array.from({ length: piece.to - piece.from + 1 }, () => helixTorsions);
  for (const loop of piece.loops)
    torsions.splice(loop.from - piece.from, loop.torsions.length, ...loop.torsions);
  return torsions;
}

function standUp(residues: BackboneResidue[], piece: Piece): BackboneResidue[] {
  const { stand } = piece;
  const moved = residues.map((residue) => moveResidue(residue, uprightMove(residues, piece, stand)));
  const marker = moved[stand.level.index - piece.from];
  const lift = marker ? stand.level.zAngstrom - marker.CB[2] : 0;
  return moved.map((residue) => moveResidue(residue, (point) => add(point, [0, 0, lift])));
}

/** Shortest turn that sets the helix on z, a turn about z by the phase, a move of the helix to its place. */
function uprightMove(residues: BackboneResidue[], piece: Piece, stand: Stand): (point: Xyz) => Xyz {
  const [from, to] = stand.helix;
  const start = axisPoint(residues, from - piece.from + 2);
  const direction = unit(subtract(axisPoint(residues, to - piece.from - 2), start));
  const target = stand.up ? upward : scale(upward, -1);
  const hinge = unit(cross(direction, target));
  const angle = (Math.acos(Math.min(1, Math.max(-1, dot(direction, target)))) * 180) / Math.PI;
  const [x, y] = stand.atAngstrom;
  return (point) =>
    add(turn(turn(subtract(point, start), hinge, angle), upward, stand.phaseDegrees), [x, y, 0]);
}

/** Point on the axis of an ideal helix beside a residue that has helix on both sides. */
function axisPoint(residues: BackboneResidue[], step: number): Xyz {
  const ca = (place: number): Xyz => residues[place]?.CA ?? upward;
  const here = ca(step);
  const inward = unit(subtract(add(ca(step - 1), ca(step + 1)), scale(here, 2)));
  return add(here, scale(inward, helixRadiusAngstrom));
}
