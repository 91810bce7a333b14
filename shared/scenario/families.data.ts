import type { Organism } from './organisms.data';
import type { ScenarioAlignment, ScenarioFamily } from './scenario-types';

/**
 * A stretch of the ancestor. In the template a capital is a residue that never changes, a small letter a site that does
 * (its surrounding: m membrane helix, h helix, l loop, s strand, t tail).
 */
export interface Block {
  name: string;
  template: string;
  /** Named sites by their offset in the template. */
  sites?: Record<string, number>;
}

/** An insertion or deletion on one branch of the tree; never inside a helix. Offsets count in the block's template. */
export type LengthChange =
  | { branch: string; block: string; after: number; insert: string }
  | { branch: string; block: string; at: number; remove: number };

export interface FamilyPlan {
  family: ScenarioFamily;
  part: ScenarioAlignment['part'];
  fileName: string;
  blocks: Block[];
  lengthChanges: LengthChange[];
  /** Sites that differ by organism in a way that matters to the motor. */
  exceptions: { site: string; organism: Organism; letter: string }[];
  /** Pattern that every row holds exactly once. */
  signature: RegExp;
}

const strandUnit = 'ssssssllhhhhhhhhhhll';

/** Two membrane helices; the loop `R-[NQ]-P` faces the head, the carboxylate stands 20 residues after its R, as in real c subunits. */
const c: FamilyPlan = {
  family: 'c',
  part: 'rotor',
  fileName: 'c-ring-subunits.afa',
  blocks: [
    { name: 'tail', template: 'Mttttttt' },
    { name: 'helix 1', template: 'mmmmmGmGmGmGmGmmmmmmmmmmmmmmmhhh' },
    { name: 'turn', template: 'lllRNP', sites: { 'loop arginine': 3, 'loop polar': 4 } },
    { name: 'helix 2', template: 'hhmmmmmmmmmmmmmmmEmmmmmmmmmmmmmh', sites: { carboxylate: 17 } },
    { name: 'end', template: 'ttttt' },
  ],
  lengthChanges: [
    { branch: 'salt', block: 'tail', after: 4, insert: 'tttt' },
    { branch: 'Halverina salsa', block: 'turn', after: 1, insert: 'll' },
    { branch: 'Halverina salsa', block: 'end', at: 2, remove: 3 },
    { branch: 'warm', block: 'end', after: 4, insert: 'tt' },
    { branch: 'Thermolira ampla', block: 'tail', at: 2, remove: 4 },
    { branch: 'Quessimonas lenta', block: 'tail', at: 1, remove: 6 },
    { branch: 'Quessimonas lenta', block: 'turn', at: 2, remove: 1 },
    { branch: 'Brundivola clara', block: 'tail', after: 6, insert: 'ttttt' },
    { branch: 'cold', block: 'tail', after: 2, insert: 'tt' },
    { branch: 'Pelvissonia rubra', block: 'end', at: 3, remove: 2 },
    { branch: 'Nerivola profunda', block: 'turn', after: 2, insert: 'lll' },
  ],
  exceptions: [
    { site: 'carboxylate', organism: 'Cryorota nivalis', letter: 'D' },
    { site: 'carboxylate', organism: 'Brundivola clara', letter: 'D' },
    { site: 'carboxylate', organism: 'Nerivola profunda', letter: 'Q' },
    { site: 'loop polar', organism: 'Salivena maris', letter: 'Q' },
    { site: 'loop polar', organism: 'Halverina salsa', letter: 'Q' },
  ],
  signature: /R[NQ]P/g,
};

/** Six membrane helices, the last two long, along the ring; offsets to the arginine are this family's own. */
const a: FamilyPlan = {
  family: 'a',
  part: 'stator',
  fileName: 'a-subunits.afa',
  blocks: [
    { name: 'leader', template: 'Mttttttt' },
    { name: 'tail', template: 'tttttttttttttttttt' },
    { name: 'helix 1', template: 'hhhhmmmmmmmmmmmmmmmmmmmmmhhhh' },
    { name: 'loop 1', template: 'llllll' },
    { name: 'helix 2', template: 'hhhmmmmmmmmmmmmmmmmmmmmmhhh' },
    { name: 'loop 2', template: 'llllll' },
    { name: 'helix 3', template: 'hhmmmmmmmmmmmmmmmmmmmmmhhhh' },
    { name: 'loop 3', template: 'llllllllllllllll' },
    { name: 'helix 4', template: 'hhhhmmmmmmmmmmmmmmmmmmmmmhh' },
    { name: 'loop 4', template: 'llllllll' },
    {
      name: 'helix 5',
      template: 'hmmmmmmmEmmmmmmSmmmRmmmNmmmmmmEmmmhh',
      sites: { 'n-side acid': 8, 'channel serine': 15, 'essential arginine': 19, 'p-side acid': 30 },
    },
    { name: 'loop 5', template: 'lllllll' },
    {
      name: 'helix 6',
      template: 'hhmmmmmmHmmmmmmQmmmmmmmmmmmmmhh',
      sites: { 'p-side partner': 8, 'arginine partner': 15 },
    },
    { name: 'end', template: 'tttttttttt' },
  ],
  lengthChanges: [
    { branch: 'temperate', block: 'loop 3', after: 7, insert: 'lll' },
    { branch: 'salt', block: 'tail', after: 5, insert: 'tttt' },
    { branch: 'Halverina salsa', block: 'loop 1', after: 2, insert: 'l' },
    { branch: 'Ostravella minor', block: 'end', at: 7, remove: 3 },
    { branch: 'warm', block: 'loop 3', at: 4, remove: 5 },
    { branch: 'Thermolira ampla', block: 'leader', at: 1, remove: 6 },
    { branch: 'spring', block: 'loop 5', after: 3, insert: 'll' },
    { branch: 'Quessimonas lenta', block: 'tail', at: 3, remove: 7 },
    { branch: 'deep', block: 'tail', at: 6, remove: 5 },
    { branch: 'cold', block: 'leader', at: 2, remove: 4 },
    { branch: 'Cryorota nivalis', block: 'loop 4', after: 3, insert: 'l' },
    { branch: 'Nerivola profunda', block: 'loop 2', after: 3, insert: 'lllll' },
    { branch: 'Nerivola profunda', block: 'end', after: 8, insert: 'ttt' },
  ],
  exceptions: [
    // The acid and its partner trade places between the two p-side positions, as they do between real organisms.
    { site: 'p-side acid', organism: 'Thermolira ampla', letter: 'H' },
    { site: 'p-side partner', organism: 'Thermolira ampla', letter: 'E' },
    { site: 'p-side acid', organism: 'Nerivola profunda', letter: 'H' },
    { site: 'p-side partner', organism: 'Nerivola profunda', letter: 'E' },
  ],
  signature: /S...R...N/g,
};

/** A barrel, a nucleotide-binding part and a helical end. */
const beta: FamilyPlan = {
  family: 'β',
  part: 'catalytic head',
  fileName: 'beta-subunits.afa',
  blocks: [
    { name: 'tail', template: 'Mttttttttttt' },
    { name: 'barrel 1', template: 'ssssssslllsssssslllssssssl' },
    { name: 'link 1', template: 'llllll' },
    { name: 'barrel 2', template: 'sssssslllssssssslllsssssll' },
    { name: 'core 1', template: strandUnit + strandUnit + 'sssssssllhhhhhhhhhhhhlll' },
    { name: 'link 2', template: 'lllllll' },
    { name: 'core 2', template: 'hhhhhhhhhhhllssss' },
    {
      name: 'P-loop',
      template: 'ssssssGGSGLGKThhhhhhhhhhhll',
      sites: { 'P-loop lysine': 12, 'P-loop threonine': 13 },
    },
    {
      name: 'catalytic strand',
      template: 'sssssssssGERlllhhhhhhhh',
      sites: { 'catalytic acid': 10, 'catalytic arginine': 11 },
    },
    { name: 'link 3', template: 'lllllll' },
    {
      name: 'Walker B',
      template: 'hhhhhhhhhhhhhhllsssssssDllllRhhhhhhhhhhhl',
      sites: { 'Walker B acid': 23, 'phosphate arginine': 28 },
    },
    { name: 'core 3', template: strandUnit + 'ssssll' },
    { name: 'signature', template: 'PSINlllSlSll' },
    { name: 'adenine loop', template: 'hhhhhhhlllssYllllssss', sites: { 'adenine tyrosine': 12 } },
    { name: 'helices 1', template: 'hhhhhhhhhhhhhhhhhhllhhhhhhhhhhhhhhh' },
    { name: 'lever', template: 'DELSDEDhhhhh', sites: { 'lever acid': 0 } },
    { name: 'helices 2', template: 'hhhhhhhhhhhhhhhlllhhhhhhhhhhhhhhhlllhhhhhhhhhhhhhh' },
    { name: 'link 4', template: 'lllll' },
    { name: 'helices 3', template: 'hhhhhhhhhhhhhhhhlllhhhhhhhhhhhhhhhllhhhhhhhh' },
    { name: 'end', template: 'tttttttt' },
  ],
  lengthChanges: [
    { branch: 'temperate', block: 'tail', after: 6, insert: 'tt' },
    { branch: 'slow', block: 'link 3', after: 3, insert: 'ttt' },
    { branch: 'Salivena maris', block: 'link 1', after: 2, insert: 'lllll' },
    { branch: 'Halverina salsa', block: 'link 3', after: 5, insert: 'lll' },
    { branch: 'Halverina salsa', block: 'end', at: 4, remove: 4 },
    { branch: 'warm', block: 'tail', at: 3, remove: 5 },
    { branch: 'Thermolira ampla', block: 'link 4', at: 1, remove: 3 },
    { branch: 'spring', block: 'link 2', after: 4, insert: 'lll' },
    { branch: 'Brundivola clara', block: 'link 3', at: 2, remove: 4 },
    { branch: 'deep', block: 'link 2', at: 2, remove: 2 },
    { branch: 'cold', block: 'link 4', after: 2, insert: 'llll' },
    { branch: 'Pelvissonia rubra', block: 'tail', at: 6, remove: 3 },
    { branch: 'Nerivola profunda', block: 'tail', after: 8, insert: 'ttttt' },
    { branch: 'Nerivola profunda', block: 'link 1', at: 1, remove: 3 },
  ],
  exceptions: [],
  signature: /[AG].{4}GK[ST]/g,
};

/** A long first and last helix wound into the shaft, a globular middle. */
const gamma: FamilyPlan = {
  family: 'γ',
  part: 'rotor',
  fileName: 'gamma-subunits.afa',
  blocks: [
    { name: 'tail', template: 'Mttttt' },
    {
      name: 'shaft helix 1',
      template: 'hhhhhhhhhhhhRhhhhhhhhhhhKhhhhhhhhhhhhhhhhhhhhhhhhhhhh',
      sites: { 'first grip': 12, 'second grip': 24 },
    },
    { name: 'turn 1', template: 'llllllll' },
    { name: 'middle 1', template: 'ssssssssllhhhhhhhhhhhhhhhh' },
    { name: 'link 1', template: 'lllllllll' },
    { name: 'middle 2', template: 'sssssslllhhhhhhhhhhlllssssss' },
    { name: 'link 2', template: 'llllllllll' },
    { name: 'middle 3', template: 'ssssssslllsssssssllhhhhhhhhhhhll' },
    { name: 'turn 2', template: 'lllllll' },
    { name: 'middle 4', template: 'ssssssllhhhhhhhhhhhll' },
    {
      name: 'shaft helix 2',
      template: 'hhhhhhhhhhhhhhhhhhhhhhhhhhhhRhhhhhhhQhhhhhhhhhhhhhhhhhhhhhh',
      sites: { 'third grip': 28, 'bearing residue': 36 },
    },
    { name: 'middle 5', template: 'hhhhhlllll' },
    { name: 'end', template: 'tttttt' },
  ],
  lengthChanges: [
    { branch: 'temperate', block: 'link 1', after: 4, insert: 'll' },
    { branch: 'Ostravella minor', block: 'end', after: 3, insert: 'tt' },
    { branch: 'salt', block: 'link 2', at: 3, remove: 4 },
    { branch: 'Halverina salsa', block: 'turn 1', after: 3, insert: 'lll' },
    { branch: 'warm', block: 'turn 2', after: 2, insert: 'llll' },
    { branch: 'Thermolira ampla', block: 'tail', at: 2, remove: 3 },
    { branch: 'Brundivola clara', block: 'link 1', at: 5, remove: 3 },
    { branch: 'deep', block: 'link 2', after: 6, insert: 'lll' },
    { branch: 'Cryorota nivalis', block: 'tail', after: 3, insert: 'ttt' },
    { branch: 'Nerivola profunda', block: 'end', at: 2, remove: 4 },
    { branch: 'Nerivola profunda', block: 'turn 2', at: 3, remove: 2 },
  ],
  exceptions: [{ site: 'bearing residue', organism: 'Salivena maris', letter: 'K' }],
  signature: /^M/g,
};

export const familyPlans: FamilyPlan[] = [c, a, beta, gamma];
