import type { Xyz } from './scenario-types';
import { add, cross, radians, scale, subtract, unit } from './vectors';

/** Backbone torsions of one residue in degrees; ω is always 180. */
export type Torsions = readonly [phiDegrees: number, psiDegrees: number];

/** Heavy atoms of one residue, in ångström. */
export interface BackboneResidue {
  N: Xyz;
  CA: Xyz;
  C: Xyz;
  O: Xyz;
  CB: Xyz;
}

/** α-helix as observed on average: 3.635 residues a turn, 1.552 Å rise. */
export const helixTorsions: Torsions = [-63, -42];

// Lengths in Å and angles in degrees: Engh & Huber 1991 Acta Cryst A47:392, from memory.
const bond = { nToCa: 1.458, caToC: 1.525, cToN: 1.329, cToO: 1.231 };
const angle = { nCaC: 111.0, caCN: 117.2, cNCa: 121.7, caCO: 120.1 };
const transDegrees = 180;

/**
 * Coordinates of a chain from its torsions. The first N is at the origin, its Cα on x, its C in the xy plane.
 * Every residue gets a Cβ; leave it out for glycine.
 */
export function buildBackbone(torsions: readonly Torsions[]): BackboneResidue[] {
  const built: BackboneResidue[] = [];
  let n: Xyz = [0, 0, 0];
  let ca: Xyz = [bond.nToCa, 0, 0];
  let c: Xyz = [
    bond.nToCa - bond.caToC * Math.cos(radians(angle.nCaC)),
    bond.caToC * Math.sin(radians(angle.nCaC)),
    0,
  ];
  torsions.forEach(([, psi], index) => {
    const o = placeAtom(n, ca, c, bond.cToO, angle.caCO, psi + 180);
    built.push({ N: n, CA: ca, C: c, O: o, CB: placeCb(n, ca, c) });
    const next = torsions[index + 1];
    if (!next) return;
    const nextN = placeAtom(n, ca, c, bond.cToN, angle.caCN, psi);
    const nextCa = placeAtom(ca, c, nextN, bond.nToCa, angle.cNCa, transDegrees);
    const nextC = placeAtom(c, nextN, nextCa, bond.caToC, angle.nCaC, next[0]);
    [n, ca, c] = [nextN, nextCa, nextC];
  });
  return built;
}

/** The fourth atom after three, by its distance to the third, the angle there and the dihedral of all four (IUPAC sign). */
export function placeAtom(
  first: Xyz,
  second: Xyz,
  third: Xyz,
  distanceAngstrom: number,
  angleDegrees: number,
  dihedralDegrees: number,
): Xyz {
  const forward = unit(subtract(third, second));
  const normal = unit(cross(subtract(second, first), forward));
  const side = cross(normal, forward);
  const bend = radians(angleDegrees);
  const twist = radians(dihedralDegrees);
  const reach = distanceAngstrom * Math.sin(bend);
  const along = scale(forward, -distanceAngstrom * Math.cos(bend));
  return add(
    third,
    add(along, add(scale(side, reach * Math.cos(twist)), scale(normal, reach * Math.sin(twist)))),
  );
}

/** Cβ of an L-residue on a tetrahedral Cα: 1.53 Å away, on the side where C, N and H would turn clockwise. */
function placeCb(n: Xyz, ca: Xyz, c: Xyz): Xyz {
  const fromN = subtract(ca, n);
  const toC = subtract(c, ca);
  const normal = cross(fromN, toC);
  const offset = add(scale(fromN, 0.568), add(scale(toC, -0.541), scale(normal, -0.583)));
  return add(ca, offset);
}
