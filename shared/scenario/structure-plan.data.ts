import type { Torsions } from './backbone';

/** Where a piece of chain stands, before the whole model is turned: ring axis on z, head on the +z side. */
export interface Stand {
  /** First and last residue of the helix that is set upright. */
  helix: readonly [from: number, to: number];
  atAngstrom: readonly [x: number, y: number];
  up: boolean;
  phaseDegrees: number;
  /** This residue's Cβ stands at this height. */
  level: { index: number; zAngstrom: number };
}

/** An unbroken run of observed residues, by residue index: helix but for the loops. */
export interface Piece {
  from: number;
  to: number;
  stand: Stand;
  loops: readonly { from: number; torsions: readonly Torsions[] }[];
}

export interface ChainPlan {
  /** Declared residues, by residue index. */
  from: number;
  to: number;
  pieces: readonly Piece[];
}

// The loop torsions were found by annealing from the allowed regions (no φ between −50 and 45, none below −150): the next
// helix had to land upright at its place with no two atoms of different residues too near. Rounded to 0.1°.

/** c of the model organism: a hairpin with its loop on the head side; the first two and last two residues are not seen. */
export const hairpinPlan: ChainPlan = {
  from: 0,
  to: 82,
  pieces: [
    {
      from: 2,
      to: 80,
      stand: {
        helix: [2, 39],
        atAngstrom: [13.8, 0],
        up: true,
        phaseDegrees: 266.5,
        level: { index: 63, zAngstrom: 0 },
      },
      loops: [
        {
          from: 40,
          torsions: [
            [-53.9, 110.8],
            [-81.1, 8.5],
            [89.5, 7.4],
            [-81.2, 166.2],
            [-61.6, -61.1],
            [-60.6, -39.6],
          ],
        },
      ],
    },
  ],
};

/** a of the model organism without its leader: six helices; its start, a stretch of the third loop and its end are not seen. */
export const bundlePlan: ChainPlan = {
  from: 8,
  to: 258,
  pieces: [
    {
      from: 18,
      to: 123,
      stand: {
        helix: [18, 54],
        atAngstrom: [52.1, 9.8],
        up: false,
        phaseDegrees: 178.1,
        level: { index: 123, zAngstrom: -23.3 },
      },
      loops: [
        {
          from: 55,
          torsions: [
            [-77.1, 0.2],
            [-118.9, 122.3],
            [-93.4, -5.8],
            [-59.0, 144.1],
            [-67.9, -36.6],
            [-79.8, -12.4],
          ],
        },
        {
          from: 88,
          torsions: [
            [-55.0, -0.8],
            [-67.1, -36.7],
            [-74.1, 140.8],
            [-92.0, 13.6],
            [-81.5, 147.8],
            [-73.2, -47.6],
          ],
        },
      ],
    },
    {
      from: 135,
      to: 252,
      stand: {
        helix: [135, 166],
        atAngstrom: [43.6, -4.9],
        up: true,
        phaseDegrees: 75.3,
        level: { index: 194, zAngstrom: 0 },
      },
      loops: [
        {
          from: 167,
          torsions: [
            [-58.2, -24.1],
            [-68.6, 160.1],
            [-116.2, 116.7],
            [-109.9, 112.6],
            [-77.8, -30.7],
            [-104.7, -178.3],
            [-53.0, 10.0],
            [-54.6, -25.9],
          ],
        },
        {
          from: 211,
          torsions: [
            [-83.8, -0.2],
            [-76.8, 16.5],
            [-125.4, 133.7],
            [-64.8, -38.5],
            [-107.3, 129.2],
            [-97.0, 103.9],
            [-89.0, 161.7],
          ],
        },
      ],
    },
  ],
};

export const ringChainIds = ['K', 'L', 'M', 'N', 'O', 'P', 'Q', 'R', 'S', 'T'] as const;
export const stepDegrees = 360 / ringChainIds.length;
export const statorChainId = 'A';

/** How the finished model lies in the file: tilted about x, turned about z, then moved. */
export const lie = { tiltDegrees: 24, turnDegrees: 40, moveAngstrom: [61.5, 48.2, 70.9] } as const;
