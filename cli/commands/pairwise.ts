import { readProteinSequences } from '@/shared/sequence/alignment/read-sequences';
import { alignPair, fitsInMemory } from '@/shared/sequence/mapping/pairwise';
import { done, unusable, type Command } from '../command';
import { gapRulesOf, GAP_OPTIONS } from '../gap-options';
import { choiceOption, onePositional, readOptions } from '../options';
import { readInput } from '../read-input';

export const pairwise: Command = {
  name: 'pairwise',
  summary: 'aligns two protein sequences with affine gaps and BLOSUM62',
  usage: [
    'core pairwise FILE [--open 10] [--extend 0.5] [--ends free|global]',
    'FILE: two sequences in FASTA, plain or gzip; - is standard input.',
    '--open: cost of the first residue of a gap; --extend: of each further one; --ends free: end gaps cost nothing.',
    'Prints score, identity (identical ÷ pairs without B, Z, J, X), identical, aligned, rows: [gapped, gapped], settings.',
  ].join('\n'),
  async run(args) {
    const options = readOptions(args, { ...GAP_OPTIONS, ends: 'text' });
    const file = onePositional(options, 'FILE');
    const ends = choiceOption(options, 'ends', ['free', 'global'], 'free');
    const rules = { ...gapRulesOf(options), ends };
    const input = await readInput(file);
    if (input.value === null) return unusable(input.issues);
    const { value, issues } = readProteinSequences(input.value);
    if (value === null) return unusable(issues);
    const [a, b] = value;
    const refuse = (code: string, message: string) =>
      unusable([...issues, { code, severity: 'error', message }]);
    if (a === undefined || b === undefined || value.length > 2)
      return refuse('two-sequences-needed', `Two sequences are needed, the file holds ${value.length}.`);
    if (!fitsInMemory(a.residues.length, b.residues.length))
      return refuse(
        'sequences-too-long',
        'The two sequences are too long to be aligned; cut them into parts.',
      );
    const { score, identity, identical, aligned, rows } = alignPair(a.residues, b.residues, rules);
    const settings = { matrix: 'BLOSUM62', open: rules.openPenalty, extend: rules.extendPenalty, ends };
    return done({ score, identity, identical, aligned, rows, settings, issues });
  },
};
