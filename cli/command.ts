import type { Issue } from '@/shared/sequence/parse-result';

export interface CommandResult {
  /** 0 done (warnings allowed), 1 the input cannot be used, 2 wrong usage. */
  exitCode: 0 | 1 | 2;
  /** Printed as one JSON object, after `"version": 1`. Null only with exit code 2. */
  output: object | null;
  /** One line for standard error, with exit code 2. */
  usageError?: string;
}

/** One command of the core's command line. `run` gets the arguments after the command's name. */
export interface Command {
  name: string;
  /** One line for `core help`. */
  summary: string;
  /** The lines of `core help NAME`: synopsis first, then options and what is printed. */
  usage: string;
  run(args: string[]): Promise<CommandResult>;
}

/** Thrown for wrong arguments only; the entry point turns it into exit code 2 and one line. */
export class UsageError extends Error {}

/** The answer of a command whose input can be used; warnings travel in `output.issues`. */
export function done(output: object): CommandResult {
  return { exitCode: 0, output };
}

/** The answer of a command whose input cannot be used; `issues` says why. */
export function unusable(issues: readonly Issue[], rest: object = {}): CommandResult {
  return { exitCode: 1, output: { ...rest, issues } };
}
