import type { Command } from './command';
import { alignment } from './commands/alignment';
import { map } from './commands/map';
import { melting } from './commands/melting';
import { pairwise } from './commands/pairwise';
import { primers } from './commands/primers';
import { structure } from './commands/structure';
import { translate } from './commands/translate';

/** Every command but `help`, in the order help lists them. */
export const COMMANDS: readonly Command[] = [
  structure,
  alignment,
  map,
  pairwise,
  translate,
  melting,
  primers,
];
