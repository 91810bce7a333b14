import { parseArgs } from 'node:util';
import { UsageError } from './command';

/** What an option takes: `text` a value, `flag` nothing. */
export type OptionKinds = Record<string, 'text' | 'flag'>;

export interface ParsedOptions {
  text(name: string): string | undefined;
  flag(name: string): boolean;
  positionals: string[];
}

/** parseArgs takes `-5` after an option for another option; joined with `=` it is a value. */
function joinNegativeValues(args: readonly string[], kinds: OptionKinds): string[] {
  const joined: string[] = [];
  for (let index = 0; index < args.length; index += 1) {
    const argument = args[index] ?? '';
    const next = args[index + 1];
    const takesValue = argument.startsWith('--') && kinds[argument.slice(2)] === 'text';
    if (takesValue && next !== undefined && /^-[\d.]/.test(next)) {
      joined.push(`${argument}=${next}`);
      index += 1;
    } else joined.push(argument);
  }
  return joined;
}

/** Reads the options of one command. Throws UsageError for an unknown option or a missing value. */
export function readOptions(args: readonly string[], kinds: OptionKinds): ParsedOptions {
  const options = Object.fromEntries(
    Object.entries(kinds).map(([name, kind]) => [
      name,
      { type: kind === 'text' ? ('string' as const) : ('boolean' as const) },
    ]),
  );
  try {
    const { values, positionals } = parseArgs({
      args: joinNegativeValues(args, kinds),
      options,
      allowPositionals: true,
      strict: true,
    });
    const known: Record<string, unknown> = values;
    return {
      text: (name) => (typeof known[name] === 'string' ? known[name] : undefined),
      flag: (name) => known[name] === true,
      positionals,
    };
  } catch (error) {
    const message = error instanceof Error ? error.message : String(error);
    throw new UsageError(message.split('\n')[0] ?? 'the options could not be read');
  }
}

export interface NumberLimits {
  min?: number;
  max?: number;
  integer?: boolean;
}

/** A number given as an option, or the fallback. Throws UsageError when it is no number or out of range. */
export function numberOption(
  options: ParsedOptions,
  name: string,
  fallback: number,
  limits: NumberLimits = {},
): number {
  const text = options.text(name);
  if (text === undefined) return fallback;
  const value = text.trim() === '' ? Number.NaN : Number(text);
  const { min = -Infinity, max = Infinity, integer = false } = limits;
  if (!Number.isFinite(value)) throw new UsageError(`--${name} needs a number, not "${text}"`);
  if (integer && !Number.isInteger(value))
    throw new UsageError(`--${name} needs a whole number, not ${text}`);
  if (value < min) throw new UsageError(`--${name} must be at least ${min}, not ${text}`);
  if (value > max) throw new UsageError(`--${name} must be at most ${max}, not ${text}`);
  return value;
}

/** One of a list of words given as an option, or the fallback. */
export function choiceOption<Choice extends string>(
  options: ParsedOptions,
  name: string,
  choices: readonly Choice[],
  fallback: Choice,
): Choice {
  const text = options.text(name);
  if (text === undefined) return fallback;
  const choice = choices.find((candidate) => candidate === text);
  if (choice === undefined)
    throw new UsageError(`--${name} must be one of ${choices.join(', ')}, not "${text}"`);
  return choice;
}

/** An option that must be there. */
export function requiredOption(options: ParsedOptions, name: string): string {
  const text = options.text(name);
  if (text === undefined) throw new UsageError(`--${name} is needed`);
  return text;
}

/** The one file a command works on. */
export function onePositional(options: ParsedOptions, what: string): string {
  const [first, ...others] = options.positionals;
  if (first === undefined) throw new UsageError(`${what} is needed`);
  if (others.length > 0) throw new UsageError(`only one ${what} is read, found also "${others[0]}"`);
  return first;
}
