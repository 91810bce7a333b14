import type { Part } from '../../../shared/contracts';

export interface FamilySeed {
  name: string;
  aliases: string[];
  description: string;
  part: Part;
  catalytic?: true;
}

const greek = { α: 'alpha', β: 'beta', γ: 'gamma', δ: 'delta', ε: 'epsilon' } as const;
const family = (name: string, description: string, part: Part, catalytic?: true): FamilySeed => ({
  name,
  aliases: name in greek ? [greek[name as keyof typeof greek]] : [],
  description,
  part,
  ...(catalytic && { catalytic }),
});

/** Subunits a project starts with, by its kind of motor (handbook 1.1, standard nomenclature, from memory). */
export const motorFamilies: Record<'F' | 'V' | 'A', FamilySeed[]> = {
  F: [
    family('c', 'ring', 'rotor'),
    family('γ', 'shaft', 'rotor'),
    family('ε', 'shaft foot', 'rotor'),
    family('a', 'stator in the membrane', 'stator'),
    family('α', 'head', 'head'),
    family('β', 'head, catalytic', 'head', true),
    family('b', 'stalk', 'stalk'),
    family('δ', 'stalk', 'stalk'),
  ],
  V: [
    family('c', 'ring', 'rotor'),
    family('c′', 'ring', 'rotor'),
    family('c″', 'ring', 'rotor'),
    family('D', 'shaft', 'rotor'),
    family('F', 'shaft foot', 'rotor'),
    family('d', 'cap on the ring', 'rotor'),
    family('a', 'stator in the membrane', 'stator'),
    family('A', 'head, catalytic', 'head', true),
    family('B', 'head', 'head'),
    family('E', 'stalk', 'stalk'),
    family('G', 'stalk', 'stalk'),
    family('C', 'stalk', 'stalk'),
    family('H', 'stalk', 'stalk'),
    family('e', 'membrane', 'other'),
  ],
  A: [
    family('c', 'ring', 'rotor'),
    family('D', 'shaft', 'rotor'),
    family('F', 'shaft foot', 'rotor'),
    family('C', 'cap on the ring', 'rotor'),
    family('a', 'stator in the membrane', 'stator'),
    family('A', 'head, catalytic', 'head', true),
    family('B', 'head', 'head'),
    family('E', 'stalk', 'stalk'),
    family('G', 'stalk', 'stalk'),
  ],
};
