import { readPdb } from '@/shared/structure/pdb/read-pdb';
import { summariseStructure } from '@/shared/structure/summary';
import { done, unusable, type Command } from '../command';
import { numberOption, onePositional, readOptions } from '../options';
import { readInput } from '../read-input';

export const structure: Command = {
  name: 'structure',
  summary: 'reads coordinates and lists chains, residues, ligands and waters',
  usage: [
    'core structure FILE [--model N]',
    'FILE: PDB format, plain or gzip; - is standard input. --model: as numbered in the file, the first unless given.',
    'Prints format, models, chains: [{ id, labelIds, kind, declared, observed, residues: [{ label, name, letter,',
    'parent?, atoms, alternates }], ligands: [{ name, label }], waters }], atoms, issues.',
    'One position an atom: the alternate of highest occupancy, the first on ties.',
  ].join('\n'),
  async run(args) {
    const options = readOptions(args, { model: 'text' });
    const file = onePositional(options, 'FILE');
    const isModelGiven = options.text('model') !== undefined;
    const model = numberOption(options, 'model', 1, { min: 0, integer: true });
    const input = await readInput(file);
    if (input.value === null) return unusable(input.issues);
    const { value, issues } = readPdb(input.value, isModelGiven ? { model } : {});
    return value === null ? unusable(issues) : done({ ...summariseStructure(value), issues });
  },
};
