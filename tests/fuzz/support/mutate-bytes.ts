// What happens to files: bytes flipped, cut, doubled, moved, numbers changed.
import { between, pick } from '@/tests/support/random';

type Random = () => number;

const interesting = [0, 9, 10, 13, 32, 42, 45, 46, 62, 0x7f, 0x80, 0xc3, 0xe2, 0xef, 0xf0, 0xff];
const words = [
  '-0',
  '99999',
  '1e308',
  'NaN',
  '-',
  '*',
  '>',
  '\r\n',
  '\n\n',
  '\0',
  'é',
  '漢',
  'ENDMDL',
  'TER',
  'A'.repeat(300),
];

function span(random: Random, length: number): [start: number, end: number] {
  const start = between(random, 0, Math.max(0, length - 1));
  const most = random() < 0.8 ? 12 : length;
  return [start, Math.min(length, start + between(random, 0, most))];
}

const changes: ((random: Random, bytes: Buffer) => Buffer)[] = [
  (random, bytes) => {
    const copy = Buffer.from(bytes);
    for (let times = between(random, 1, 8); times > 0; times -= 1)
      copy[between(random, 0, copy.length - 1)] =
        random() < 0.5 ? pick(random, interesting) : between(random, 0, 255);
    return copy;
  },
  (random, bytes) => {
    const [start, end] = span(random, bytes.length);
    return Buffer.concat([bytes.subarray(0, start), bytes.subarray(end)]);
  },
  (random, bytes) => {
    const [start, end] = span(random, bytes.length);
    return Buffer.concat([bytes.subarray(0, end), bytes.subarray(start)]);
  },
  (random, bytes) => {
    const [start] = span(random, bytes.length);
    const added =
      random() < 0.5
        ? Buffer.from(pick(random, words))
        : Buffer.from(Array.from({ length: between(random, 1, 20) }, () => between(random, 0, 255)));
    return Buffer.concat([bytes.subarray(0, start), added, bytes.subarray(start)]);
  },
  (random, bytes) => bytes.subarray(0, between(random, 0, bytes.length)),
  (random, bytes) => {
    const lines = bytes.toString('latin1').split('\n');
    const one = between(random, 0, lines.length - 1);
    const other = between(random, 0, lines.length - 1);
    [lines[one], lines[other]] = [lines[other] ?? '', lines[one] ?? ''];
    return Buffer.from(lines.join('\n'), 'latin1');
  },
  (random, bytes) => {
    const text = bytes.toString('latin1');
    const numbers = [...text.matchAll(/-?\d+(\.\d+)?/g)];
    if (numbers.length === 0) return bytes;
    const { index, 0: old } = pick(random, numbers);
    const next = pick(random, ['-1', '0', '99999999', '1e9', '********', String(Math.floor(random() * 1e6))]);
    // Kept in its columns mostly, as files by column have it.
    const put = random() < 0.7 ? next.slice(0, old.length).padStart(old.length) : next;
    return Buffer.from(text.slice(0, index) + put + text.slice(index + old.length), 'latin1');
  },
];

/** One to four changes in a row. */
export function mutateBytes(random: Random, bytes: Buffer): Buffer {
  let now = bytes;
  for (let times = between(random, 1, 4); times > 0 && now.length > 0; times -= 1)
    now = pick(random, changes)(random, now);
  return now;
}
