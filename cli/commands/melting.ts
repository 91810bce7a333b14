import { gcPercent } from '@/shared/sequence/primers/gc';
import { meltingOf } from '@/shared/sequence/primers/melting';
import {
  DEFAULT_MELTING_CONDITIONS,
  NEAREST_NEIGHBOUR_SETS,
  SALT_METHODS,
  type MeltingConditions,
} from '@/shared/sequence/primers/melting-conditions';
import { decodeText, linesOf } from '@/shared/sequence/text-file';
import { done, unusable, UsageError, type Command } from '../command';
import { choiceOption, numberOption, onePositional, readOptions, type ParsedOptions } from '../options';
import { readInput } from '../read-input';

/** Issues of a sequence that is no DNA; a mismatch without a value is none of them. */
const UNREADABLE = new Set(['unknown-base', 'sequence-too-short', 'complement-length']);

function conditionsOf(options: ParsedOptions): MeltingConditions {
  const standard = DEFAULT_MELTING_CONDITIONS;
  const amount = (name: string, fallback: number) => numberOption(options, name, fallback, { min: 0 });
  return {
    set: choiceOption(options, 'set', NEAREST_NEIGHBOUR_SETS, standard.set),
    salt: choiceOption(options, 'salt', SALT_METHODS, standard.salt),
    sodiumMillimolar: amount('sodium-mM', standard.sodiumMillimolar),
    potassiumMillimolar: amount('potassium-mM', standard.potassiumMillimolar),
    trisMillimolar: amount('tris-mM', standard.trisMillimolar),
    magnesiumMillimolar: amount('magnesium-mM', standard.magnesiumMillimolar),
    dntpMillimolar: amount('dntp-mM', standard.dntpMillimolar),
    oligoNanomolar: amount('oligo-nM', standard.oligoNanomolar),
    templateNanomolar: amount('template-nM', standard.templateNanomolar),
  };
}

function resultOf(text: string, conditions: MeltingConditions, complement?: string) {
  const sequence = text.toUpperCase();
  const { value, issues } = meltingOf(sequence, conditions, complement?.toUpperCase());
  return {
    sequence,
    celsius: value?.celsius ?? null,
    enthalpyKcalPerMol: value?.enthalpyKcalPerMol ?? null,
    entropyCalPerMolKelvin: value?.entropyCalPerMolKelvin ?? null,
    gcPercent: gcPercent(sequence),
    selfComplementary: value?.selfComplementary ?? false,
    issues,
  };
}

export const melting: Command = {
  name: 'melting',
  summary: 'melting temperature of oligonucleotides by nearest neighbours',
  usage: [
    'core melting SEQUENCE [--complement SEQ] [options]',
    'core melting --file FILE [options]',
    '',
    '--file        sequences, one a line; - is standard input.',
    '--complement  the other strand, written 3′→5′, as long as the sequence; may hold mismatches inside.',
    `--set         ${NEAREST_NEIGHBOUR_SETS.join(' | ')} (unified)`,
    `--salt        ${SALT_METHODS.join(' | ')} (santalucia)`,
    '--sodium-mM 50  --potassium-mM 0  --tris-mM 0  --magnesium-mM 0  --dntp-mM 0  --oligo-nM 250  --template-nM 0',
    '',
    'The strand term is oligo − template/2; a sequence that is its own reverse complement is recognised. Monovalent methods take the',
    'sodium equivalent when magnesium is given.',
    'Prints results: sequence, celsius (null with an issue when it cannot be computed), enthalpyKcalPerMol,',
    'entropyCalPerMolKelvin (1 M), gcPercent, selfComplementary, issues; settings; issues.',
  ].join('\n'),
  async run(args) {
    const options = readOptions(args, {
      file: 'text',
      complement: 'text',
      set: 'text',
      salt: 'text',
      'sodium-mM': 'text',
      'potassium-mM': 'text',
      'tris-mM': 'text',
      'magnesium-mM': 'text',
      'dntp-mM': 'text',
      'oligo-nM': 'text',
      'template-nM': 'text',
    });
    const settings = conditionsOf(options);
    const file = options.text('file');
    const complement = options.text('complement');
    if (file === undefined) {
      const result = resultOf(onePositional(options, 'SEQUENCE'), settings, complement);
      const output = { results: [result], settings };
      return result.issues.some(({ code }) => UNREADABLE.has(code))
        ? unusable(result.issues, output)
        : done({ ...output, issues: [] });
    }
    if (options.positionals.length > 0) throw new UsageError('give a SEQUENCE or --file, not both');
    if (complement !== undefined)
      throw new UsageError('--complement goes with one SEQUENCE, not with --file');
    const input = await readInput(file);
    if (input.value === null) return unusable(input.issues);
    const text = decodeText(input.value);
    if (text.value === null) return unusable(text.issues);
    const results = [...linesOf(text.value)]
      .filter((line) => line.text.trim() !== '')
      .map(({ number, text: line }) => {
        const result = resultOf(line.trim(), settings);
        return { ...result, issues: result.issues.map((issue) => ({ ...issue, line: number })) };
      });
    const output = { results, settings };
    const readable = results.some(({ issues }) => !issues.some(({ code }) => UNREADABLE.has(code)));
    return readable
      ? done({ ...output, issues: text.issues })
      : unusable([...text.issues, ...results.flatMap(({ issues }) => issues)], output);
  },
};
