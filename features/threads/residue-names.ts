import { formsOf } from '@/shared/sequence/address/family-forms';
import { readAddress } from '@/shared/sequence/address/read-address';
import type { AddressFamily } from '@/shared/sequence/address/types';

/** A residue as somebody wrote it: which one is meant is asked when it is opened. */
export interface WrittenName {
  text: string;
  family: string;
  letter: string;
  label: string;
  mutationTo: string | null;
}

const escape = (text: string): string => text.replace(/[.*+?^${}()|[\]\\]/g, '\\$&');

/** Names that say family, letter and number in one word: cE62, βK162, c-E62Q, cGlu62. Null without families. */
export function residueNamePattern(families: readonly AddressFamily[]): RegExp | null {
  const forms = [...new Set(families.flatMap(formsOf))].sort((a, b) => b.length - a.length);
  if (forms.length === 0) return null;
  const acid = '(?:[A-Z]|[A-Z][a-z]{2})';
  const edge = '[\\p{L}\\p{N}_]';
  return new RegExp(
    `(?<!${edge}|[-:/.])(?:${forms.map(escape).join('|')})-?${acid}\\d{1,5}(?:${acid})?(?!${edge}|[.:]\\d)`,
    'gu',
  );
}

function readName(text: string, families: readonly AddressFamily[]): WrittenName | null {
  const { readings } = readAddress(text, { families, chainIds: [] });
  const reading = readings.find(({ kind, letter }) => kind === 'family' && letter !== null);
  if (!reading || reading.family === null || reading.letter === null) return null;
  const { family, letter, label, mutationTo } = reading;
  return { text, family, letter, label, mutationTo };
}

/** Cuts a text into plain words and the residue names in it. Nothing that needs a guess of the family is a name. */
export function cutAtNames(
  text: string,
  families: readonly AddressFamily[],
  pattern: RegExp,
): (string | WrittenName)[] {
  const parts: (string | WrittenName)[] = [];
  let from = 0;
  for (const match of text.matchAll(pattern)) {
    const name = readName(match[0], families);
    if (!name) continue;
    if (match.index > from) parts.push(text.slice(from, match.index));
    parts.push(name);
    from = match.index + match[0].length;
  }
  if (from < text.length) parts.push(text.slice(from));
  return parts;
}
