import { readAlignment } from '@/shared/sequence/alignment/read-alignment';
import { done, unusable, type Command } from '../command';
import { onePositional, readOptions } from '../options';
import { readInput } from '../read-input';

export const alignment: Command = {
  name: 'alignment',
  summary: 'reads an alignment and lists its rows and every problem',
  usage: [
    'core alignment FILE',
    'FILE: aligned FASTA, plain or gzip; - is standard input.',
    'Prints format, columns, rows: [{ name, residues (gapped), ungappedLength }], issues.',
  ].join('\n'),
  async run(args) {
    const file = onePositional(readOptions(args, {}), 'FILE');
    const input = await readInput(file);
    if (input.value === null) return unusable(input.issues);
    const { value, issues } = readAlignment(input.value);
    if (value === null) return unusable(issues);
    const rows = value.rows.map(({ name, text, residues }) => ({
      name,
      residues: text,
      ungappedLength: residues.length,
    }));
    return done({ format: value.format, columns: value.columnCount, rows, issues });
  },
};
