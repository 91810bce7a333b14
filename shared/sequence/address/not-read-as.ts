import { codeOfLetter } from '../alphabet';
import { readBodies } from './body';
import { familiesAtStart, formsOf } from './family-forms';
import { hasChainForm } from './read-chain';
import type { AddressContext, AddressReading } from './types';

/** Sentences on what a text was not read as, each with the spelling that would mean it. */
export function notReadAs(
  text: string,
  readings: readonly AddressReading[],
  { families, chainIds }: AddressContext,
): string[] {
  const notes: string[] = [];
  const chain = hasChainForm(text) ? text.slice(0, text.indexOf(':')).trim() : null;
  if (chain !== null && !chainIds.includes(chain))
    notes.push(`Not read as chain ${chain}: no current structure has a chain of this name.`);

  const alone = families.find((family) => formsOf(family).includes(text));
  if (alone !== undefined)
    notes.push(
      `Not read as the family ${alone.name} as a whole: add a residue, for example ${alone.name}-10.`,
    );

  const first = text.charAt(0);
  const rest = text.slice(1);
  const behind = readBodies(rest);
  if (!/^[A-Za-z]$/.test(first) || behind.length === 0) return notes;
  const named = familiesAtStart(first, families);
  const isRead = (name: string) => readings.some((reading) => reading.family === name);
  for (const { family, typed, how } of named) {
    if (isRead(family.name) || typed !== first) continue;
    const change = behind.find((body) => body.mutationTo !== null);
    if (how === 'exact' && change !== undefined)
      notes.push(
        `Not read as family ${family.name}: ${text} is a change of ${codeOfLetter(first)}${change.label}. Write ${family.name}-${rest}.`,
      );
    else if (how === 'other-case')
      notes.push(`Not read as family ${family.name}: case counts. Write ${family.name}${rest}.`);
  }
  const isPlain = /^\d+$/.test(rest);
  if (isPlain && first !== first.toLowerCase() && !named.some(({ how }) => how === 'exact'))
    notes.push(`Not read as family ${first}: this project has none.`);
  const alpha = families.find((family) => formsOf(family).includes('α'));
  if (first.toLowerCase() === 'a' && alpha !== undefined)
    notes.push(`Not read as α: a bare a is never α. Write α${rest} or alpha${rest}.`);
  return notes;
}
