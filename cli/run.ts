import { UsageError, type Command, type CommandResult } from './command';
import { makeHelp } from './commands/help';

const OUTPUT_VERSION = 1;

/** Runs one command line; wrong usage and the unforeseen become results, never exceptions. */
export async function runCommand(
  commands: readonly Command[],
  argv: readonly string[],
): Promise<CommandResult> {
  const [asked, ...args] = argv;
  const all = [...commands, makeHelp(commands)];
  const wantsHelp = asked === '--help' || asked === '-h';
  const command = all.find((candidate) => candidate.name === (wantsHelp ? 'help' : asked));
  if (command === undefined) {
    const usageError = asked === undefined ? 'a command is needed' : `there is no command "${asked}"`;
    return { exitCode: 2, output: null, usageError: `${usageError}; see core help` };
  }
  try {
    return await command.run(args);
  } catch (error) {
    if (error instanceof UsageError)
      return { exitCode: 2, output: null, usageError: `${command.name}: ${error.message}` };
    const message = `The command failed on this input (${error instanceof Error ? error.message : 'unknown'}).`;
    return { exitCode: 1, output: { issues: [{ code: 'command-failed', severity: 'error', message }] } };
  }
}

/** The object as it is printed: `version` first. */
export function printed(output: object): string {
  return `${JSON.stringify({ version: OUTPUT_VERSION, ...output })}\n`;
}
