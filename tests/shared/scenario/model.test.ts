import { breaksOfChain } from '@/shared/sequence/mapping/chain-breaks';
import { matchChains } from '@/shared/sequence/mapping/match-chains';
import { buildBackbone, helixTorsions, type BackboneResidue } from '@/shared/scenario/backbone';
import { makeScenario, type ScenarioChain, type Xyz } from '@/shared/scenario/scenario';
import { add, cross, distance, dot, scale, subtract, unit } from '@/shared/scenario/vectors';
import { readPdb } from '@/shared/structure/pdb/read-pdb';
import geometryChecks from '@/tests/fixtures/geometry-checks.json';

const { structure, alignments } = makeScenario();
const { value: model, issues } = readPdb(new TextEncoder().encode(structure.text));

describe('the file, read back', () => {
  it('has no error and no warning', () => {
    expect(issues).toEqual([]);
  });

  it('gives the chains, residues and missing residues of the truth', () => {
    expect(model?.chains.map((chain) => chain.id)).toEqual(structure.chains.map((chain) => chain.id));
    for (const truth of structure.chains) {
      const chain = model?.chains.find((candidate) => candidate.id === truth.id);
      const seen = truth.residues.filter((residue) => residue.observed);
      const unseen = truth.residues.filter((residue) => !residue.observed);
      expect(chain?.declared).toBe(truth.residues.map((residue) => residue.letter).join(''));
      expect(chain?.observed).toBe(seen.map((residue) => residue.letter).join(''));
      expect(chain?.residues.map((residue) => residue.label)).toEqual(
        seen.map((residue) => String(residue.authorNumber)),
      );
      expect(chain?.residues.map((residue) => residue.declaredIndex)).toEqual(
        seen.map((residue) => truth.residues.indexOf(residue)),
      );
      expect(chain?.missing).toEqual(unseen.map((residue) => String(residue.authorNumber)));
    }
  });

  it('lets every chain be mapped to its protein as the truth has it', () => {
    const proteins = alignments.flatMap(({ family, rows }) =>
      rows.map(({ organism, residues }) => ({
        id: `${family} ${organism}`,
        name: organism,
        family,
        residues,
      })),
    );
    const matches = matchChains(model?.chains ?? [], proteins);
    expect(matches).toHaveLength(11);
    for (const { chain, maps } of matches) {
      const truth = structure.chains.find((candidate) => candidate.id === chain.id);
      expect(maps[0]?.proteinId).toBe(`${truth?.family} ${truth?.organism}`);
      const indices = maps[0]?.segments.flatMap((segment) =>
        Array.from({ length: segment.length }, (_, step) => segment.proteinStart + step),
      );
      expect(indices).toEqual(truth?.residues.filter(({ observed }) => observed).map(({ index }) => index));
    }
  });

  it('has a chain break at the missing stretch of the a subunit and nowhere else', () => {
    const breaks = model?.chains.map((chain) => [chain.id, breaksOfChain(chain.residues).length]);
    expect(breaks).toEqual(structure.chains.map((chain) => [chain.id, chain.id === 'A' ? 1 : 0]));
  });
});

describe('the truth', () => {
  it('is ten c hairpins and one a subunit of one organism', () => {
    expect(structure.chains.map(({ family }) => family).join('')).toBe('acccccccccc');
    expect(new Set(structure.chains.map(({ organism }) => organism)).size).toBe(1);
  });

  it('names letters as the protein has them', () => {
    for (const { family, organism, residues } of structure.chains) {
      const row = alignments
        .find((alignment) => alignment.family === family)
        ?.rows.find((candidate) => candidate.organism === organism);
      for (const { index, letter } of residues) expect(letter).toBe(row?.residues.charAt(index));
    }
  });

  it('numbers the a subunit by its mature chain, so that author number and sequence number differ', () => {
    for (const { authorNumber, index } of truthOf('A').residues) expect(authorNumber).toBe(index + 1 - 8);
    for (const { authorNumber, index } of truthOf('K').residues) expect(authorNumber).toBe(index + 1);
  });
});

describe('the geometry', () => {
  const chains = structure.chains.map((truth) => ({ truth, residues: atomsOf(truth) }));

  it('keeps peptide bonds at 1.33 Å and Cα–Cα at 3.8 Å within each unbroken run', () => {
    for (const { residues } of chains) {
      for (const [here, next] of neighbours(residues)) {
        expect(Math.abs(distance(here.at('C'), next.at('N')) - 1.33)).toBeLessThan(0.01);
        expect(Math.abs(distance(here.at('CA'), next.at('CA')) - 3.8)).toBeLessThan(0.05);
      }
    }
  });

  it('has full backbones, with Cβ on all but glycine', () => {
    for (const { residues } of chains) {
      for (const residue of residues) {
        expect(residue.names).toEqual(['N', 'CA', 'C', 'O', ...(residue.letter === 'G' ? [] : ['CB'])]);
      }
    }
  });

  it('holds L-residues only', () => {
    for (const { residues } of chains) {
      for (const residue of residues.filter(({ letter }) => letter !== 'G')) {
        const ca = residue.at('CA');
        const arms = ['N', 'C', 'CB'].map((name) => subtract(residue.at(name), ca));
        const [n, c, cb] = arms as [Xyz, Xyz, Xyz];
        expect(dot(cross(n, c), cb)).toBeGreaterThan(1);
      }
    }
  });

  it('brings no two atoms of residues that are not neighbours nearer than 2.2 Å', () => {
    const atoms = chains.flatMap(({ truth, residues }) =>
      residues.flatMap((residue) =>
        residue.names.map((name) => ({ chain: truth.id, index: residue.index, at: residue.at(name) })),
      ),
    );
    let nearest = Infinity;
    let nearestBetweenChains = Infinity;
    atoms.forEach((first, place) => {
      for (let other = place + 1; other < atoms.length; other += 1) {
        const second = atoms[other];
        if (!second || Math.abs(second.at[0] - first.at[0]) > 4) continue;
        if (first.chain === second.chain && Math.abs(first.index - second.index) < 2) continue;
        const apart = distance(first.at, second.at);
        nearest = Math.min(nearest, apart);
        if (first.chain !== second.chain) nearestBetweenChains = Math.min(nearestBetweenChains, apart);
      }
    });
    expect(nearest).toBeGreaterThan(2.2);
    expect(nearestBetweenChains).toBeGreaterThan(2.8);
  });

  it('turns each ring copy 36° on from the one before, right-handed about the axis', () => {
    const { direction, point } = structure.axis;
    expect(Math.sqrt(dot(direction, direction))).toBeCloseTo(1, 6);
    const ring = chains.filter(({ truth }) => truth.copy !== null);
    expect(ring.map(({ truth }) => truth.copy)).toEqual([1, 2, 3, 4, 5, 6, 7, 8, 9, 10]);
    const arms = ring.map(({ residues }) => armFromAxis(centre(residues), direction, point));
    arms.forEach((arm, step) => {
      const first = arms[0] ?? arm;
      const sine = dot(cross(first, arm), direction);
      const angle = (Math.atan2(sine, dot(first, arm)) * 180) / Math.PI;
      expect((angle + 360.001) % 360).toBeCloseTo(step * 36, 1);
      expect(ring[step]?.truth.angleDegrees).toBe(step * 36);
    });
  });

  it('gives the ring the size of a real one', () => {
    // PDB 4BEM, eleven positions: chain centroids 17.1–17.5 Å, carboxylate CD 20.1–20.4 Å from the axis.
    const { direction, point } = structure.axis;
    for (const { truth, residues } of chains.filter((chain) => chain.truth.copy !== null)) {
      const radius = length(armFromAxis(centre(residues), direction, point));
      expect(radius).toBeGreaterThan(15.5);
      expect(radius).toBeLessThan(18.5);
      const loop = residues.find(({ index }) => index === 43);
      const tail = residues.find(({ index }) => index === 80);
      // The loop faces the head: further along the axis than the end of helix 2.
      if (loop && tail) expect(dot(subtract(loop.at('CA'), tail.at('CA')), direction)).toBeGreaterThan(40);
      expect(truth.residues.find(({ index }) => index === 43)?.letter).toBe('R');
    }
  });

  it('sets the arginine of a beside the carboxylate of copy 1 and of no other copy', () => {
    const site = (family: string, name: string) => {
      const alignment = alignments.find((candidate) => candidate.family === family);
      const row = alignment?.rows.find(({ organism }) => organism === structure.chains[0]?.organism);
      const column = alignment?.sites[name];
      return column === undefined ? -1 : (row?.columns.indexOf(column) ?? -1);
    };
    const arginine = chains[0]?.residues.find(({ index }) => index === site('a', 'essential arginine'));
    expect(arginine?.letter).toBe('R');
    const distances = chains.slice(1).map(({ residues }) => {
      const carboxylate = residues.find(({ index }) => index === site('c', 'carboxylate'));
      return carboxylate && arginine ? distance(carboxylate.at('CB'), arginine.at('CB')) : NaN;
    });
    expect(distances[0]).toBeLessThan(7.5);
    for (const apart of distances.slice(1)) expect(apart).toBeGreaterThan(12);
  });
});

describe('the ideal helix', () => {
  const helix = buildBackbone(Array.from({ length: 24 }, () => helixTorsions));
  // Computed with numpy from the same torsions and bond geometry.
  const expected = geometryChecks.idealBackbone.find(({ phi, psi }) => phi === -63 && psi === -42);

  it('has the turn and rise computed elsewhere', () => {
    const bend = (index: number) =>
      unit(subtract(add(ca(helix, index - 1), ca(helix, index + 1)), scale(ca(helix, index), 2)));
    const turn = (Math.acos(dot(bend(8), bend(9))) * 180) / Math.PI;
    const axis = unit(cross(bend(8), bend(9)));
    expect(360 / turn).toBeCloseTo(expected?.residuesPerTurn ?? NaN, 3);
    expect(dot(subtract(ca(helix, 9), ca(helix, 8)), axis)).toBeCloseTo(
      expected?.risePerResidueAngstrom ?? NaN,
      3,
    );
  });

  it('has the hydrogen bond energies computed elsewhere (Kabsch & Sander 1983 Biopolymers 22:2577)', () => {
    const energies = expected?.kabschSanderEnergy_kcal_mol;
    expect(energies).toBeDefined();
    expect(bondEnergy(helix, 8, 11)).toBeCloseTo(energies?.['O(i)<-HN(i+3)'] ?? NaN, 3);
    expect(bondEnergy(helix, 8, 12)).toBeCloseTo(energies?.['O(i)<-HN(i+4)'] ?? NaN, 3);
    expect(bondEnergy(helix, 8, 13)).toBeCloseTo(energies?.['O(i)<-HN(i+5)'] ?? NaN, 3);
  });
});

interface ReadResidue {
  index: number;
  letter: string;
  names: string[];
  at: (name: string) => Xyz;
}

function truthOf(id: string): ScenarioChain {
  const chain = structure.chains.find((candidate) => candidate.id === id);
  if (!chain) throw new Error(`no chain ${id}`);
  return chain;
}

/** Coordinates as the file has them, with the residue each belongs to. */
function atomsOf(truth: ScenarioChain): ReadResidue[] {
  if (!model) throw new Error('the file was not read');
  const { atoms } = model;
  const chain = model.chains.find((candidate) => candidate.id === truth.id);
  const seen = truth.residues.filter(({ observed }) => observed);
  return (chain?.residues ?? []).map((residue, place) => {
    const places = Array.from({ length: residue.atomCount }, (_, step) => residue.atomStart + step);
    const at = (name: string): Xyz => {
      const found = places.find((atom) => atoms.names[atom] === name);
      if (found === undefined) throw new Error(`no ${name} in ${truth.id}:${residue.label}`);
      return [atoms.xAngstrom[found] ?? NaN, atoms.yAngstrom[found] ?? NaN, atoms.zAngstrom[found] ?? NaN];
    };
    return {
      index: seen[place]?.index ?? -1,
      letter: residue.letter,
      names: places.map((atom) => atoms.names[atom] ?? ''),
      at,
    };
  });
}

function neighbours(residues: ReadResidue[]): [ReadResidue, ReadResidue][] {
  return residues.flatMap((residue, place): [ReadResidue, ReadResidue][] => {
    const next = residues[place + 1];
    return next && next.index === residue.index + 1 ? [[residue, next]] : [];
  });
}

function centre(residues: ReadResidue[]): Xyz {
  const sum = residues.reduce<Xyz>((total, residue) => add(total, residue.at('CA')), [0, 0, 0]);
  return scale(sum, 1 / residues.length);
}

/** From the axis straight to a point. */
function armFromAxis(at: Xyz, direction: Xyz, point: Xyz): Xyz {
  const offset = subtract(at, point);
  return subtract(offset, scale(direction, dot(offset, direction)));
}

function length(vector: Xyz): number {
  return Math.sqrt(dot(vector, vector));
}

function ca(residues: BackboneResidue[], index: number): Xyz {
  return residues[index]?.CA ?? [NaN, NaN, NaN];
}

/** kcal/mol; H stands 1 Å from N, opposite to the C=O before it. */
function bondEnergy(residues: BackboneResidue[], acceptor: number, donor: number): number {
  const from = residues[acceptor];
  const to = residues[donor];
  const before = residues[donor - 1];
  if (!from || !to || !before) return NaN;
  const h = add(to.N, unit(subtract(before.C, before.O)));
  const inverse = (a: Xyz, b: Xyz) => 1 / distance(a, b);
  return 27.888 * (inverse(from.O, to.N) + inverse(from.C, h) - inverse(from.O, h) - inverse(from.C, to.N));
}
