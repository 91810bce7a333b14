import type { Organism } from './organisms.data';
import type { ScenarioAnnotation, ScenarioFamily } from './scenario-types';

/** A residue by its site in a family; the model organism's unless another is named. */
export interface SiteName {
  family: ScenarioFamily;
  site: string;
  organism?: Organism;
}

export interface AnnotationText extends Omit<ScenarioAnnotation, 'residues'> {
  sites: SiteName[];
}

export interface ThreadText {
  site: SiteName;
  messages: readonly (readonly [author: string, text: string])[];
}

export interface MutantText {
  author: string;
  changes: { site: SiteName; to: string }[];
  reason: string;
}

// Texts hold marks in braces that are filled in from the generated data, so that no letter and no number is typed here:
// {c.carboxylate} a residue of the model organism, {c.carboxylate @ Cryorota nivalis} of another, {c.carboxylate > Q} a change,
// {a.essential arginine # sequence} in a numbering that is not the one shown first, {= nearest copy distance} a fact of the data.

const carboxylate: SiteName = { family: 'c', site: 'carboxylate' };
const arginine: SiteName = { family: 'a', site: 'essential arginine' };

export const annotationTexts: AnnotationText[] = [
  {
    author: 'verrin',
    sites: [carboxylate],
    kind: 'ion site',
    text: 'Carries the ion. The column holds E in {= rows with E} rows, D in {= rows with D} and Q in {= rows with Q}.',
    evidence: [
      { kind: 'conservation', reference: 'Alignment of the c family, this project' },
      { kind: 'mutant', reference: 'Windlass notebook 14, page 31 (invented)' },
    ],
    confidence: 'high',
    status: 'accepted',
    decidedBy: 'corrow',
  },
  {
    author: 'marrick',
    sites: [carboxylate, arginine],
    kind: 'facing charge',
    text:
      '{c.carboxylate} on copy 1 faces {a.essential arginine}: {= nearest copy distance} Å from Cβ to Cβ in the model. ' +
      'The next nearest is chain {= second copy chain} at {= second copy distance} Å.',
    evidence: [{ kind: 'coordinates', reference: 'Ring and stator model, chains A and K' }],
    confidence: 'medium',
    status: 'accepted',
    decidedBy: 'corrow',
  },
  {
    author: 'brant',
    sites: [{ ...carboxylate, organism: 'Cryorota nivalis' }],
    kind: 'note',
    text: 'Slow when aspartate: {c.carboxylate @ Cryorota nivalis} releases the ion later than a glutamate would.',
    evidence: [{ kind: 'other', reference: 'Ostrey, letter to the consortium, spring (invented)' }],
    confidence: 'low',
    status: 'contested',
    decidedBy: 'marrick',
    reason: 'The rates in that letter were taken at two temperatures and cannot be compared.',
  },
  {
    author: 'marrick',
    sites: [{ family: 'a', site: 'n-side acid' }],
    kind: 'path',
    text:
      'Inner end of the n-side half-channel, on the same helix as {a.essential arginine} and ' +
      '{= acid before arginine} residues before it.',
    evidence: [{ kind: 'coordinates', reference: 'Ring and stator model, chain A' }],
    confidence: 'low',
    status: 'proposed',
  },
  {
    author: 'corrow',
    sites: [{ family: 'a', site: 'p-side acid', organism: 'Thermolira ampla' }],
    kind: 'caution',
    text:
      'Same column, not the same role. In *Thermolira ampla* the acid and its partner trade places: ' +
      '{a.p-side acid @ Thermolira ampla} and {a.p-side partner @ Thermolira ampla}, where *Orvella tarda* has ' +
      '{a.p-side acid} and {a.p-side partner}.',
    evidence: [{ kind: 'conservation', reference: 'Alignment of the a family, this project' }],
    confidence: 'high',
    status: 'accepted',
    decidedBy: 'corrow',
  },
  {
    author: 'hadwin',
    sites: [{ family: 'β', site: 'P-loop lysine' }],
    kind: 'nucleotide site',
    text: 'Holds the end phosphate of the nucleotide. {β.P-loop threonine} beside it binds the magnesium.',
    evidence: [
      { kind: 'conservation', reference: 'Alignment of the β family, this project' },
      { kind: 'publication', reference: 'Hadwin & Brant, Slow Motors 3, 12 (invented)' },
    ],
    confidence: 'high',
    status: 'accepted',
    decidedBy: 'verrin',
  },
  {
    author: 'brant',
    sites: [{ family: 'γ', site: 'second grip' }],
    kind: 'hinge or grip',
    text: 'With {γ.first grip} and {γ.third grip} it grips the lever, {β.lever acid}, in one state only.',
    evidence: [{ kind: 'single-molecule rotation', reference: 'Windlass notebook 9, page 4 (invented)' }],
    confidence: 'low',
    status: 'proposed',
  },
  {
    author: 'marrick',
    sites: [{ family: 'c', site: 'loop arginine' }],
    kind: 'contact',
    text: '{c.loop arginine} touches the foot of the shaft.',
    evidence: [{ kind: 'other', reference: 'Minutes of the summer meeting (invented)' }],
    confidence: 'low',
    status: 'retired',
    decidedBy: 'corrow',
    reason: 'No chain of the model belongs to the shaft, so the contact has not been seen.',
  },
];

export const threadTexts: ThreadText[] = [
  {
    site: carboxylate,
    messages: [
      ['hadwin', 'What should {c.carboxylate} become first? I would start with {c.carboxylate > Q}.'],
      [
        'verrin',
        'Copy 1 is the only one under 10 Å from {a.essential arginine}: {= nearest copy distance} Å from Cβ to Cβ. ' +
          'In the file they are K:{= carboxylate author number} and A:{= arginine author number}.',
      ],
      [
        'marrick',
        'A shorter side chain works elsewhere: {c.carboxylate @ Cryorota nivalis} in *Cryorota nivalis* and ' +
          '{c.carboxylate @ Brundivola clara} in *Brundivola clara*. So charge may matter more than reach. {c.carboxylate > D} would tell.',
      ],
      [
        'brant',
        '{c.carboxylate @ Nerivola profunda} of *Nerivola profunda* has no charge at all and the organism still grows. I would not call it dead ' +
          'before we know what that ring carries.',
      ],
      [
        'hadwin',
        'Then all three: {c.carboxylate > Q}, {c.carboxylate > D}, and {c.carboxylate > A} as the zero.',
      ],
      ['brant', 'I can take the plate on Wednesday. The three pairs fit one row.'],
    ],
  },
  {
    site: arginine,
    messages: [
      [
        'brant',
        'My notes say {a.essential arginine # sequence}, the model says A:{= arginine author number}. Are these one residue?',
      ],
      [
        'corrow',
        'Yes. The model counts the mature chain, which begins {= leader length} residues later: ' +
          '{a.essential arginine} there, {a.essential arginine # sequence} in the precursor.',
      ],
      [
        'verrin',
        'Mind the loop before helix 4: A:{= gap first} to A:{= gap last} are not in the coordinates, so do not count along ' +
          'the chain by hand.',
      ],
      [
        'marrick',
        '{a.arginine partner} on the last helix, on the other hand, is there. Worth a look for a hydrogen bond.',
      ],
    ],
  },
  {
    site: { family: 'β', site: 'P-loop lysine' },
    messages: [
      ['verrin', 'There is no head in this model. Where do we argue the state of the three copies?'],
      [
        'hadwin',
        'Here, but only from sequence for now: {β.P-loop lysine}, {β.catalytic acid} and {β.Walker B acid} stand in all ' +
          '{= organisms} rows.',
      ],
      ['brant', 'I leave {β.catalytic acid > Q} out of the plan until we have a construct for β.'],
    ],
  },
  {
    site: { ...carboxylate, organism: 'Cryorota nivalis' },
    messages: [
      ['brant', 'Pinned as slow. The number comes from the spring letter.'],
      [
        'marrick',
        'I contest it: two temperatures in one table. {c.carboxylate @ Brundivola clara} of *Brundivola clara* is an aspartate too, ' +
          'and nobody calls that one slow.',
      ],
      ['corrow', 'It stays contested until one of you repeats it at one temperature.'],
    ],
  },
];

export const mutantTexts: MutantText[] = [
  {
    author: 'hadwin',
    changes: [{ site: carboxylate, to: 'Q' }],
    reason:
      'Takes the charge away and keeps the shape; Nerivola profunda carries a Q there: {c.carboxylate @ Nerivola profunda}.',
  },
  {
    author: 'marrick',
    changes: [{ site: carboxylate, to: 'D' }],
    reason:
      'Keeps the charge, one carbon shorter, as {c.carboxylate @ Cryorota nivalis} of Cryorota nivalis.',
  },
  {
    author: 'hadwin',
    changes: [{ site: carboxylate, to: 'A' }],
    reason: 'The zero of the row: neither charge nor reach.',
  },
  {
    author: 'brant',
    changes: [{ site: { family: 'c', site: 'loop polar' }, to: 'Q' }],
    reason:
      'Control away from the membrane; {c.loop polar @ Salivena maris} of Salivena maris shows that the loop bears it.',
  },
];
