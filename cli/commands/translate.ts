import {
  isStartCodon,
  isGeneticCodeId,
  translate as translateBases,
  GENETIC_CODE_IDS,
  type GeneticCodeId,
} from '@/shared/sequence/construct/genetic-code';
import { readDnaRecords, type DnaLimits, type DnaRecord } from '@/shared/sequence/construct/read-dna';
import { hasErrors, type Issue } from '@/shared/sequence/parse-result';
import { decodeText } from '@/shared/sequence/text-file';
import { done, unusable, UsageError, type Command } from '../command';
import { numberOption, onePositional, readOptions, type ParsedOptions } from '../options';
import { readInput } from '../read-input';

const LIMITS: Partial<DnaLimits> = { maxBases: 60_000_000, maxRecords: 200_000 };

/** `--table`: one of the genetic codes offered. */
export function geneticCodeOption(options: ParsedOptions): GeneticCodeId {
  const id = numberOption(options, 'table', 11, { integer: true });
  if (!isGeneticCodeId(id))
    throw new UsageError(`--table must be one of ${GENETIC_CODE_IDS.join(', ')}, not ${id}`);
  return id;
}

function translateRecord({ name, bases }: DnaRecord, start: number, table: GeneticCodeId) {
  const issues: Issue[] = [];
  const sense = bases.slice(start - 1);
  if (sense.length === 0)
    issues.push({
      code: 'start-outside',
      severity: 'error',
      message: `The record has ${bases.length} bases; there is none at ${start}.`,
    });
  const rest = sense.length % 3;
  if (rest > 0)
    issues.push({
      code: 'partial-codon',
      severity: 'warning',
      message: `The last ${rest === 1 ? 'base is' : 'two bases are'} no whole codon and left out.`,
    });
  const protein = translateBases(sense, table);
  const codon = sense.slice(0, 3);
  return {
    name,
    protein,
    stops: [...protein].flatMap((letter, index) => (letter === '*' ? [index] : [])),
    startsWith: { codon, isStart: isStartCodon(codon, table) },
    issues,
  };
}

export const translate: Command = {
  name: 'translate',
  summary: 'translates coding sequences with a genetic code',
  usage: [
    'core translate FILE [--table 11] [--start 1]',
    '',
    'FILE      DNA as FASTA (many records) or bare letters; - is standard input.',
    `--table   NCBI genetic code: ${GENETIC_CODE_IDS.join(', ')}.`,
    '--start   first base of the first codon, from 1.',
    '',
    'Prints records: name, protein (literal: no rule for start codons, stops as *, ambiguous codons X, whole codons only),',
    'stops (indices from 0), startsWith (codon, isStart), issues; table; issues of the file.',
  ].join('\n'),
  async run(args) {
    const options = readOptions(args, { table: 'text', start: 'text' });
    const table = geneticCodeOption(options);
    const start = numberOption(options, 'start', 1, { integer: true, min: 1 });
    const input = await readInput(onePositional(options, 'FILE'));
    if (input.value === null) return unusable(input.issues);
    const text = decodeText(input.value);
    if (text.value === null) return unusable(text.issues);
    const { value, issues } = readDnaRecords(text.value, LIMITS);
    const all = [...text.issues, ...issues];
    if (value === null) return unusable(all);
    const records = value.map((record) => translateRecord(record, start, table));
    const nothing = records.every((record) => hasErrors(record.issues));
    return nothing
      ? unusable([...all, ...records.flatMap((record) => record.issues)])
      : done({ table, records, issues: all });
  },
};
