import type { Command } from './command';
import { alignment } from './commands/alignment';
import { map } from './commands/map';
import { pairwise } from './commands/pairwise';
import { structure } from './commands/structure';

/** Every command but `help`, in the order help lists them. */
export const COMMANDS: readonly Command[] = [structure, alignment, map, pairwise];
