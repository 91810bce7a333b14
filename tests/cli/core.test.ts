import { spawnSync } from 'node:child_process';
import { mkdtempSync, readFileSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { gzipSync } from 'node:zlib';
import { COMMANDS } from '@/cli/registry';
import { runCommand } from '@/cli/run';

const root = join(__dirname, '../..');
const alignmentFile = join(root, 'tests/fixtures/alignments/c_small_mafft.afa');
const folder = mkdtempSync(join(tmpdir(), 'core-'));
afterAll(() => rmSync(folder, { recursive: true }));

const written = (name: string, content: string | Uint8Array) => {
  const path = join(folder, name);
  writeFileSync(path, content);
  return path;
};
const run = (...args: string[]) => runCommand(COMMANDS, args);
const core = (args: string[], input?: string | Buffer) =>
  spawnSync(process.execPath, ['--import', 'tsx', 'cli/core.ts', ...args], {
    cwd: root,
    input: input ?? '',
    encoding: 'utf8',
  });

describe('as a process', () => {
  test('0: one JSON object that begins with the version', () => {
    const { status, stdout, stderr } = core(['alignment', alignmentFile]);
    expect([status, stderr]).toEqual([0, '']);
    expect(stdout).toMatch(/^\{"version":1,.*\}\n$/);
    expect(JSON.parse(stdout)).toMatchObject({ format: 'fasta', columns: 184, issues: [] });
  });

  test('gzip from standard input gives the same', () => {
    const { status, stdout } = core(['alignment', '-'], gzipSync(readFileSync(alignmentFile)));
    expect(status).toBe(0);
    expect(stdout).toBe(core(['alignment', alignmentFile]).stdout);
  });

  test('1: the issues say why', () => {
    const { status, stdout, stderr } = core(['alignment', '-'], 'no alignment');
    expect([status, stderr]).toEqual([1, '']);
    expect(JSON.parse(stdout)).toMatchObject({ version: 1, issues: [{ code: 'kind-unknown', line: 1 }] });
  });

  test('2: one line on standard error, nothing else', () => {
    for (const args of [[], ['nothing'], ['alignment'], ['alignment', 'a', 'b'], ['map', '--what']]) {
      const { status, stdout, stderr } = core(args);
      expect([args, status, stdout]).toEqual([args, 2, '']);
      expect(stderr).toMatch(/^[^\n]+\n$/);
    }
  });
});

test.each([
  ['a missing file', join(folder, 'none'), 'file-unreadable'],
  ['a folder', folder, 'file-unreadable'],
  [
    'a damaged gzip',
    written('cut.gz', gzipSync(readFileSync(alignmentFile)).subarray(0, 200)),
    'gzip-damaged',
  ],
  ['an empty file', written('empty', ''), 'file-empty'],
  ['coordinates', join(root, 'tests/fixtures/structures/1A8O.pdb'), 'wrong-kind-coordinates'],
])('%s cannot be used, and says so', async (_, file, code) => {
  expect(await run('alignment', file)).toMatchObject({
    exitCode: 1,
    output: { issues: [{ code, severity: 'error' }] },
  });
});

describe('pairwise', () => {
  const pair = written('pair.fasta', '>a\nMENLNMDLL\n>b\nMENMDLL\n');

  test('prints score, identity, rows and the settings it used', async () => {
    const { output } = await run('pairwise', pair, '--open', '2', '--ends=global');
    // By hand: M5 E5 N6 (L N skipped: 2 + 0.5) M5 D6 L4 L4 = 35 − 2.5.
    expect(output).toMatchObject({
      score: 32.5,
      identical: 7,
      aligned: 7,
      identity: 1,
      settings: { matrix: 'BLOSUM62', open: 2, extend: 0.5, ends: 'global' },
    });
  });

  test.each([
    [['--ends', 'loose'], 'must be one of free, global'],
    [['--open', 'ten'], 'needs a number'],
    [['--open', '-1'], 'at least 0'],
  ])('%s is wrong usage', async (options, message) => {
    const result = await run('pairwise', pair, ...options);
    expect(result).toMatchObject({ exitCode: 2, output: null });
    expect(result.usageError).toContain(message);
  });

  test('needs two sequences', async () => {
    const three = written('three.fasta', '>a\nMEN\n>b\nMEN\n>c\nMEN\n');
    expect(await run('pairwise', three)).toMatchObject({
      exitCode: 1,
      output: { issues: [{ code: 'two-sequences-needed' }] },
    });
  });
});

test('map: an unknown row and a refused file say what is wrong, and in which file', async () => {
  const structure = join(root, 'tests/fixtures/structures/4bem.pdb');
  const files = ['--structure', structure, '--alignment', alignmentFile];
  expect(await run('map', ...files, '--row', 'none')).toMatchObject({
    exitCode: 1,
    output: { issues: expect.arrayContaining([expect.objectContaining({ code: 'row-unknown' })]) },
  });
  const swapped = await run('map', '--structure', alignmentFile, '--alignment', structure);
  expect(swapped.exitCode).toBe(1);
  expect(swapped.output).toMatchObject({
    issues: [{ file: alignmentFile }, { file: structure, code: 'wrong-kind-coordinates' }],
  });
});

test('help names every command, and describes each', async () => {
  const { output } = await run('help');
  const names = COMMANDS.map((command) => command.name);
  expect(output).toMatchObject({ commands: [...names, 'help'].map((name) => ({ name })) });
  for (const name of [...names, 'help']) {
    const described = await run('help', name);
    expect(described).toMatchObject({ exitCode: 0, output: { name } });
  }
  expect(await run('help', 'nothing')).toMatchObject({ exitCode: 2 });
});
