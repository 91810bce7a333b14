import { done, UsageError, type Command } from '../command';

const ABOUT = [
  'core COMMAND … runs the scientific core on files, without a server, and prints one JSON object.',
  'Exit status: 0 done (warnings are in "issues"), 1 the input cannot be used ("issues" says why), 2 wrong usage.',
  'Files ending in gzip are read as they are; - is standard input. Indices count from 0; labels are text.',
];

/** `help` and `help COMMAND`, over the commands it is given. */
export function makeHelp(commands: readonly Command[]): Command {
  const help: Command = {
    name: 'help',
    summary: 'describes all commands, or one: help COMMAND',
    usage: 'core help [COMMAND]',
    run(args) {
      const [name, ...rest] = args;
      if (rest.length > 0) throw new UsageError('help takes one command');
      const all = [...commands, help];
      if (name === undefined) {
        const listed = all.map((command) => ({ name: command.name, summary: command.summary }));
        return Promise.resolve(done({ about: ABOUT, commands: listed }));
      }
      const command = all.find((candidate) => candidate.name === name);
      if (command === undefined) throw new UsageError(`there is no command "${name}"; see core help`);
      const { summary, usage } = command;
      return Promise.resolve(done({ name, summary, usage: usage.split('\n') }));
    },
  };
  return help;
}
