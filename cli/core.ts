import { COMMANDS } from './registry';
import { printed, runCommand } from './run';

async function main(): Promise<void> {
  const result = await runCommand(COMMANDS, process.argv.slice(2));
  // A reader that closes the pipe early (head, say) is no failure of ours.
  process.stdout.on('error', () => undefined);
  if (result.output !== null) process.stdout.write(printed(result.output));
  else if (result.usageError !== undefined) process.stderr.write(`${result.usageError.split('\n')[0]}\n`);
  // Not process.exit: it would cut long output short in a pipe.
  process.exitCode = result.exitCode;
}

void main();
