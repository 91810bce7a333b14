import { mkdtempSync, rmSync, writeFileSync } from 'node:fs';
import { tmpdir } from 'node:os';
import { join } from 'node:path';
import { COMMANDS } from '@/cli/registry';
import { runCommand } from '@/cli/run';
import { translate } from '@/shared/sequence/construct/genetic-code';
import { readFixtureJson } from '../../support/read-fixture';

const folder = mkdtempSync(join(tmpdir(), 'sequence-commands-'));
afterAll(() => rmSync(folder, { recursive: true }));

function written(name: string, content: string): string {
  const path = join(folder, name);
  writeFileSync(path, content);
  return path;
}

interface Printed {
  issues: { code: string; message: string; line?: number; column?: number }[];
  records: {
    name: string;
    protein: string;
    stops: number[];
    startsWith: object;
    issues: { code: string }[];
  }[];
  results: { sequence: string; celsius: number | null; issues: { code: string; line?: number }[] }[];
  settings: Record<string, unknown>;
  encodes: string;
  caution: string;
  mutations: {
    asked: string;
    codonFrom: string | null;
    codonTo: string | null;
    issues: { code: string; message: string }[];
    designs: {
      scheme: string;
      score: number;
      reasons: string[];
      product: string;
      encodes: string;
      proved: boolean;
      checks: { name: string; passed: boolean; value: number; limit: string }[];
      primers: { name: string; sequence: string; strand: string; start: number; length: number }[];
    }[];
  }[];
}

/** Exit code and output, as printed: through JSON. */
async function core(...args: string[]) {
  const { exitCode, output, usageError } = await runCommand(COMMANDS, args);
  return { exitCode, usageError, output: JSON.parse(JSON.stringify(output)) as Printed };
}

const cds = join(__dirname, '../../fixtures/dna/vcholerae_atp_cds.fasta');
const worked = readFixtureJson<{ construct: string; orfStart0: number; protein: string }>(
  'mutagenesis-checks.json',
);
const plasmid = written('plasmid.fasta', `>plasmid\n${worked.construct}\n`);
const start = String(worked.orfStart0 + 1);

describe('translate', () => {
  test('many records, with the stops and how each starts', async () => {
    const { exitCode, output } = await core('translate', cds, '--table', '11');
    expect(exitCode).toBe(0);
    expect(output.issues).toEqual([]);
    expect(output.records).toHaveLength(9);
    expect(output.records[6]).toMatchObject({
      name: 'VIBCH_atpE',
      stops: [85],
      startsWith: { codon: 'ATG', isStart: true },
      issues: [],
    });
  });

  test('another start, a rest that is no codon', async () => {
    const { output } = await core('translate', written('short.fasta', '>s\nAATGGATAAGG\n'), '--start', '2');
    expect(output.records[0]).toMatchObject({
      protein: 'MDK',
      stops: [],
      issues: [{ code: 'partial-codon' }],
    });
  });

  test('what cannot be read: 1, with issues; wrong usage: 2', async () => {
    const bad = await core('translate', written('bad.fasta', '>s\nAC!T\n'));
    expect([bad.exitCode, bad.output.issues]).toMatchObject([
      1,
      [{ code: 'unknown-base', line: 2, column: 3 }],
    ]);
    expect((await core('translate', written('tiny.fasta', '>s\nACG\n'), '--start', '9')).exitCode).toBe(1);
    expect((await core('translate', join(folder, 'none'))).output.issues[0]?.code).toBe('file-unreadable');
    for (const args of [[], [cds, '--table', '6'], [cds, '--start', '0'], [cds, '--start', 'x']])
      expect([args, (await core('translate', ...args)).exitCode]).toEqual([args, 2]);
  });
});

describe('melting', () => {
  // Handbook 10.4, condition C and, with a mismatch, its table (Biopython 1.80).
  test('one sequence, perfect and with a mismatch', async () => {
    const perfect = await core(
      'melting',
      'tggtctgaacgctatcccgatg',
      '--salt',
      'santalucia',
      '--oligo-nM',
      '500',
    );
    expect(perfect.exitCode).toBe(0);
    expect(Math.abs((perfect.output.results[0]?.celsius ?? 0) - 60.97)).toBeLessThanOrEqual(0.1);
    const mismatched = await core(
      'melting',
      'TGGTCTGAACGCTATCCCGATG',
      '--complement',
      'ACCAGACTTGAGATAGGGCTAC',
      '--oligo-nM',
      '500',
    );
    expect(Math.abs((mismatched.output.results[0]?.celsius ?? 0) - 54.08)).toBeLessThanOrEqual(0.1);
    expect(perfect.output.settings).toMatchObject({
      set: 'unified',
      salt: 'santalucia',
      sodiumMillimolar: 50,
      oligoNanomolar: 500,
    });
  });

  test('null with an issue where the table has no value', async () => {
    const { exitCode, output } = await core(
      'melting',
      'TGGTCTGAACGCTATCCCGATG',
      '--complement',
      'ACCAGACTTGAAATAGGGCTAC',
    );
    expect(exitCode).toBe(0);
    expect(output.results[0]).toMatchObject({ celsius: null, issues: [{ code: 'mismatch-not-in-table' }] });
  });

  test('many, one a line, with the line of each issue', async () => {
    const file = written('primers.txt', 'GTAAAACGACGGCCAGT\n\nACGNACGT\n');
    const { exitCode, output } = await core('melting', '--file', file, '--salt', 'none');
    expect(exitCode).toBe(0);
    expect(output.results.map(({ sequence }) => sequence)).toEqual(['GTAAAACGACGGCCAGT', 'ACGNACGT']);
    expect(output.results[1]?.issues).toMatchObject([{ code: 'unknown-base', line: 3 }]);
  });

  test('1 when nothing can be read, 2 for wrong usage', async () => {
    expect((await core('melting', 'HELLO')).exitCode).toBe(1);
    for (const args of [
      [],
      ['ACGT', '--set', 'best'],
      ['ACGT', '--sodium-mM', '-5'],
      ['ACGT', '--file', 'x'],
      ['--file', 'x', '--complement', 'A'],
    ])
      expect([args, (await core('melting', ...args)).exitCode]).toEqual([args, 2]);
  });
});

describe('primers', () => {
  const design = (...args: string[]) =>
    core('primers', '--construct', plasmid, '--start', start, '--circular', ...args);

  test('each mutation is answered in the order asked, proved, with the caution', async () => {
    const { exitCode, output } = await design('--mutation', 'D61N,D59N,D61E', '--top', '3');
    expect(exitCode).toBe(0);
    expect(output.encodes).toBe(worked.protein);
    expect(output.mutations.map(({ asked }) => asked)).toEqual(['D61N', 'D59N', 'D61E']);
    const [first, second, third] = output.mutations;
    expect(first?.designs).toHaveLength(3);
    expect([third?.codonFrom, third?.codonTo]).toEqual(['GAT', 'GAA']);
    for (const { scheme, proved, encodes, product, primers, checks } of first?.designs ?? []) {
      expect([scheme, proved]).toEqual(['complementary-pair', true]);
      expect(encodes).toBe(`${worked.protein.slice(0, 60)}N${worked.protein.slice(61)}`);
      expect(`${translate(product.slice(worked.orfStart0, worked.orfStart0 + 240), 11)}`).toBe(`${encodes}*`);
      expect(primers.map(({ strand }) => strand)).toEqual(['+', '-']);
      expect(checks.find(({ name }) => name === 'pair-rule-melting')).toMatchObject({
        passed: true,
        limit: 'at least 78',
      });
    }
    expect(second).toMatchObject({
      codonFrom: null,
      designs: [],
      issues: [{ code: 'mutation-letter-differs' }],
    });
    expect(second?.issues[0]?.message).toContain(
      'at 59 stands Leu (L), not Asp (D). The nearest D stands at 61',
    );
    expect(output.caution).toContain('Check the design before you order.');
    expect(output.caution).toContain('biosafety');
  });

  test('labels with an offset, changes made together', async () => {
    const { output } = await design('--mutation', 'D161N+A162G', '--offset', '100', '--top', '1');
    expect(output.mutations[0]?.designs[0]?.encodes.slice(58, 64)).toBe('LVNGIP');
    expect(output.mutations[0]?.codonFrom).toBe('GAT+GCC');
  });

  test('one of several records, on real DNA', async () => {
    const several = await core('primers', '--construct', cds, '--start', '1', '--mutation', 'D60Q');
    expect([several.exitCode, several.output.issues]).toMatchObject([1, [{ code: 'several-records' }]]);
    const chosen = await core(
      'primers',
      '--construct',
      cds,
      '--record',
      'VIBCH_atpE',
      '--start',
      '1',
      '--mutation',
      'D60Q',
    );
    expect(chosen.output.mutations[0]?.designs[0]?.proved).toBe(true);
  });

  test.each([
    ['a start outside', ['--start', '99999'], 'start-outside'],
    ['out of frame', ['--end', '290'], 'not-in-frame'],
    ['a stop inside', ['--end', String(worked.orfStart0 + 240 + 9)], 'inner-stop'],
  ])('1 for %s', async (_, args, code) => {
    const { exitCode, output } = await core(
      'primers',
      '--construct',
      plasmid,
      '--start',
      start,
      '--circular',
      '--mutation',
      'D61N',
      ...args,
    );
    expect(exitCode).toBe(1);
    expect(output.issues.map((issue) => issue.code)).toContain(code);
  });

  test('what is not designed yet says so', async () => {
    const scheme = await design('--mutation', 'D61N', '--scheme', 'back-to-back');
    expect([scheme.exitCode, scheme.output.mutations[0]?.issues]).toMatchObject([
      1,
      [{ code: 'scheme-not-yet' }],
    ]);
    const scan = await design('--scan', 'alanine:40-80');
    expect([scan.exitCode, scan.output.issues]).toMatchObject([1, [{ code: 'scan-not-yet' }]]);
    const all = await design('--mutation', 'D61N', '--scheme', 'all');
    expect([all.exitCode, all.output.mutations[0]?.issues]).toMatchObject([0, [{ code: 'scheme-not-yet' }]]);
  });

  test('2 for wrong usage', async () => {
    for (const args of [
      [],
      ['--mutation', 'D61N', '--scan', 'alanine'],
      ['--mutation', 'D61N', '--scheme', 'best'],
      ['--mutation', 'D61N', '--host', 'cow'],
      ['--mutation', 'D61N', '--table', '7'],
      ['--mutation', 'D61N', '--top', '0'],
    ])
      expect([args, (await design(...args)).exitCode]).toEqual([args, 2]);
    expect((await core('primers', '--mutation', 'D61N')).exitCode).toBe(2);
  });
});
