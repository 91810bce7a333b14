import { makeConstruct } from './construct';
import { makeAlignments } from './families';
import { makeModel, makeStructure } from './model';
import { modelOrganism, organisms } from './organisms.data';
import { people, projectName, teamName } from './people.data';
import type { Scenario } from './scenario-types';
import { makeStory } from './story';

export type * from './scenario-types';

/** Seed of the demo that the product shows. */
export const demoSeed = 7;

/**
 * The demo, made up whole: people, alignments of four families, one coordinate file, one construct, and what the team wrote
 * about them, with the truth of which residue is which. Same seed, same result; another seed changes the residues only.
 */
export function makeScenario(seed: number = demoSeed): Scenario {
  const alignments = makeAlignments(seed);
  const model = makeModel(alignments);
  return {
    team: { name: teamName },
    project: { name: projectName, motorKind: 'F', readersMayComment: false },
    people,
    modelOrganism,
    organisms: [...organisms],
    alignments,
    structure: makeStructure(model),
    construct: makeConstruct(seed, alignments),
    story: makeStory(alignments, model),
  };
}
