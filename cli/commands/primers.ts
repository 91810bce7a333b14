import { HOSTS } from '@/shared/sequence/construct/codon-choice';
import { readCoding } from '@/shared/sequence/construct/coding';
import { parseMutations, type MutantRequest } from '@/shared/sequence/construct/mutation';
import { checkMutant } from '@/shared/sequence/construct/mutation-check';
import { readDna } from '@/shared/sequence/construct/read-dna';
import { offsetNumbering, type Numbering } from '@/shared/sequence/numbering/numbering';
import { hasErrors, type Issue } from '@/shared/sequence/parse-result';
import { FIGURES_CAUTION, PRIMER_CAUTION } from '@/shared/sequence/primers/caution';
import {
  placeChanges,
  preparePrimerConstruct,
  type PrimerConstruct,
} from '@/shared/sequence/primers/construct';
import { designMutant } from '@/shared/sequence/primers/design-mutant';
import { DEFAULT_PAIR_SETTINGS, type PairSettings } from '@/shared/sequence/primers/pair-settings';
import { SCHEME_NAMES, type Design, type SchemeName } from '@/shared/sequence/primers/types';
import { decodeText } from '@/shared/sequence/text-file';
import { done, unusable, UsageError, type Command } from '../command';
import { choiceOption, numberOption, readOptions, requiredOption, type ParsedOptions } from '../options';
import { readInput } from '../read-input';
import { geneticCodeOption } from './translate';

interface MutationAnswer {
  asked: string;
  codonFrom: string | null;
  codonTo: string | null;
  designs: object[];
  issues: Issue[];
}

function printed(design: Design): object {
  const { primers: pair, changes, ...rest } = design;
  return {
    ...rest,
    codonTo: changes.map(({ codonTo }) => codonTo).join('+'),
    changes,
    primers: pair.map(({ bases, misprimingSites, ...primer }) => ({
      ...primer,
      sequence: bases,
      misprimingSites,
    })),
  };
}

function answer(
  asked: string,
  construct: PrimerConstruct,
  numbering: Numbering,
  scheme: SchemeName | 'all',
  settings: PairSettings,
): MutationAnswer {
  const issues: Issue[] = [];
  const failed = (): MutationAnswer => ({ asked, codonFrom: null, codonTo: null, designs: [], issues });
  const parsed = parseMutations(asked);
  issues.push(...parsed.issues);
  const request: MutantRequest | undefined = parsed.value?.[0];
  if (!request) return failed();
  const checked = checkMutant(request, construct.coding.protein, numbering);
  issues.push(...checked.issues);
  if (checked.value === null) return failed();
  const placed = placeChanges(checked.value, construct.coding);
  issues.push(...placed.issues);
  if (placed.value === null) return failed();
  const made = designMutant(construct, placed.value, scheme, { ...settings, name: asked });
  issues.push(...made.issues);
  const [best] = made.value ?? [];
  if (!made.value || !best) return failed();
  return {
    asked,
    codonFrom: best.changes.map(({ codonFrom }) => codonFrom).join('+'),
    codonTo: best.changes.map(({ codonTo }) => codonTo).join('+'),
    designs: made.value.map(printed),
    issues,
  };
}

async function readConstruct(
  options: ParsedOptions,
): Promise<{ construct: PrimerConstruct | null; issues: Issue[] }> {
  const issues: Issue[] = [];
  const input = await readInput(requiredOption(options, 'construct'));
  issues.push(...input.issues);
  const text = input.value === null ? null : decodeText(input.value);
  issues.push(...(text?.issues ?? []));
  const name = options.text('record');
  const dna = text?.value ? readDna(text.value, name === undefined ? {} : { name }) : null;
  issues.push(...(dna?.issues ?? []));
  if (!dna?.value) return { construct: null, issues };
  const { bases } = dna.value;
  const start = numberOption(options, 'start', Number.NaN, { integer: true });
  const end =
    options.text('end') === undefined ? undefined : numberOption(options, 'end', 0, { integer: true });
  const coding = readCoding({
    bases,
    circular: options.flag('circular'),
    start,
    ...(end === undefined ? {} : { end }),
    table: geneticCodeOption(options),
    strand: options.flag('reverse') ? '-' : '+',
  });
  issues.push(...coding.issues);
  return { construct: coding.value ? preparePrimerConstruct(bases, coding.value) : null, issues };
}

export const primers: Command = {
  name: 'primers',
  summary: 'designs primers for mutations of a construct, each product read back from the primers',
  usage: [
    'core primers --construct FILE --start N [--end N] [--circular] --mutation E59Q[,…] [options]',
    '',
    '--construct  DNA as FASTA or bare letters; - is standard input. --record NAME chooses one of several records.',
    '--start      first base of the coding part, from 1; --end its last, stop codon included (left out: the first stop in frame).',
    '--circular   the construct is a whole plasmid; the coding part may run across its first base.',
    '--reverse    the coding part reads on the reverse strand, from --start downwards.',
    '--mutation   exchanges such as E59Q, several by comma, made together with +.',
    '--scan       not yet.',
    '--table 11   NCBI genetic code.      --offset 0   label − protein index from 1.',
    `--scheme     complementary-pair | all (of ${SCHEME_NAMES.join(', ')} only the first is designed yet).`,
    `--host       ${HOSTS.join(' | ')}.      --top 5      designs shown for each mutation.`,
    '',
    'Prints mutations: asked, codonFrom, codonTo, designs (scheme, score, reasons, primers, product, encodes, proved, checks), issues;',
    'encodes (the protein of the construct); settings; caution; issues.',
  ].join('\n'),
  async run(args) {
    const options = readOptions(args, {
      construct: 'text',
      record: 'text',
      start: 'text',
      end: 'text',
      circular: 'flag',
      reverse: 'flag',
      mutation: 'text',
      scan: 'text',
      table: 'text',
      offset: 'text',
      scheme: 'text',
      host: 'text',
      top: 'text',
    });
    requiredOption(options, 'construct');
    requiredOption(options, 'start');
    const scheme = choiceOption<SchemeName | 'all'>(
      options,
      'scheme',
      [...SCHEME_NAMES, 'all'],
      'complementary-pair',
    );
    const offset = numberOption(options, 'offset', 0, { integer: true });
    const settings: PairSettings = {
      ...DEFAULT_PAIR_SETTINGS,
      host: choiceOption(options, 'host', HOSTS, DEFAULT_PAIR_SETTINGS.host),
      maxDesigns: numberOption(options, 'top', DEFAULT_PAIR_SETTINGS.maxDesigns, {
        integer: true,
        min: 1,
        max: 100,
      }),
    };
    const mutation = options.text('mutation');
    const scan = options.text('scan');
    if ((mutation === undefined) === (scan === undefined))
      throw new UsageError('give either --mutation or --scan');
    if (mutation === undefined)
      return unusable([
        {
          code: 'scan-not-yet',
          severity: 'error',
          message: 'Scans are not designed yet; name the exchanges with --mutation.',
        },
      ]);
    const { construct, issues } = await readConstruct(options);
    if (construct === null) return unusable(issues);
    const numbering = offsetNumbering(construct.coding.protein.length, offset);
    const asked = mutation.split(',').map((one) => one.trim());
    const mutations = asked.map((one) => answer(one, construct, numbering, scheme, settings));
    const { host, melting } = settings;
    const output = {
      encodes: construct.coding.protein,
      mutations,
      settings: { scheme, host, table: construct.coding.table, offset, melting },
      caution: `${PRIMER_CAUTION} ${FIGURES_CAUTION}`,
    };
    const none = mutations.every((one) => one.designs.length === 0);
    return none || hasErrors(issues)
      ? unusable([...issues, ...mutations.flatMap((one) => one.issues)], output)
      : done({ ...output, issues });
  },
};
