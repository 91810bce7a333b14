import type { Thread } from '@/shared/contracts/threads';

const pairedMarks = /(?<![\p{L}\p{N}])([*_~`]{1,3})(?=\S)(.+?)(?<=\S)\1(?![\p{L}\p{N}])/gu;

/** The beginning of what was said last, without the marks of markdown; a sign within a word, as in c_61, is no mark. */
export function lastWords({ lastMessage }: Pick<Thread, 'lastMessage'>): string {
  if (!lastMessage) return 'nothing said yet';
  const text = lastMessage.text
    .replace(/!?\[([^\]\n]*)\]\([^)\n]*\)/g, '$1')
    .replace(/^\s{0,3}(?:#{1,6}|>|[-+*])\s+/gm, '')
    .replace(pairedMarks, '$2')
    .replace(pairedMarks, '$2')
    .replace(/\s+/g, ' ')
    .trim();
  return `${lastMessage.by.name}: ${text.length > 90 ? `${text.slice(0, 89).trimEnd()}…` : text}`;
}
