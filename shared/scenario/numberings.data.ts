import { modelOrganism } from './organisms.data';
import type { ScenarioNumbering } from './scenario-types';

/** The model organism's a subunit loses a leader of eight residues; its mature chain counts from the ninth. */
export const matureA: ScenarioNumbering = {
  family: 'a',
  organism: modelOrganism,
  name: 'mature',
  offset: -8,
};

/** Offset numberings that the demo offers beside each protein's own. */
export const offsetNumberings: ScenarioNumbering[] = [matureA];
