import { readFileSync } from 'node:fs';
import { join } from 'node:path';
import { COMMANDS } from '@/cli/registry';
import { runCommand } from '@/cli/run';
import { columnOfResidue } from '@/shared/sequence/alignment/columns';
import { readAlignment } from '@/shared/sequence/alignment/read-alignment';
import { residueIndex } from '@/shared/sequence/positions';

const fixtures = join(__dirname, '../../fixtures');

interface Job {
  structure: string;
  chain: string;
  alignment: string;
  row: string;
  score: number;
  observed: number;
  mapped: number;
  identical: number;
  /** author number, chain letter, alignment column from 1, row letter */
  mapping: [string, string, number, string][];
}
interface MapOutput {
  chains: {
    id: string;
    row: string;
    score: number;
    identity: number;
    coverage: number;
    segments: { chainStart: number; proteinStart: number; length: number }[];
    mismatches: unknown[];
    runnersUp: { row: string; identity: number }[];
  }[];
  unmatched: string[];
}

async function run(...args: string[]) {
  const { exitCode, output } = await runCommand(COMMANDS, args);
  expect(exitCode).toBe(0);
  return output;
}

const jobs: Job[] = JSON.parse(readFileSync(join(fixtures, 'expected/mapping.json'), 'utf8')).jobs;

// Source: Biopython 1.80 (BLOSUM62, ends free, gaps −11 and −1). The alignments it read are held as aligned
// FASTA here, with the same rows and columns.
describe.each(jobs.map((job) => [`${job.structure} chain ${job.chain}`, job] as const))('%s', (_, job) => {
  const structure = join(fixtures, 'structures', job.structure);
  const alignmentPath = join(fixtures, 'alignments', job.alignment.replace(/\.(aln|sto)$/, '.afa'));
  const files = ['--structure', structure, '--alignment', alignmentPath, '--open', '11', '--extend', '1'];

  test.each([
    ['of its own accord', []],
    ['by a given row', ['--row', job.row]],
  ])('is mapped %s, every residue on the column of the reference', async (_name, extra) => {
    const { chains } = (await run('map', ...files, ...extra)) as MapOutput;
    const chain = chains.find((candidate) => candidate.id === job.chain);
    if (chain === undefined) throw new Error('the chain was not mapped');
    expect(chain).toMatchObject({ row: job.row, score: job.score, identity: 1, coverage: 1, mismatches: [] });

    const printed = (await run('structure', structure)) as {
      chains: { id: string; residues: { label: string; letter: string }[] }[];
    };
    const residues = printed.chains.find((candidate) => candidate.id === job.chain)?.residues ?? [];
    expect(residues).toHaveLength(job.observed);
    const row = readAlignment(readFileSync(alignmentPath)).value?.rows.find((one) => one.name === job.row);
    if (row === undefined) throw new Error('no such row');
    const found = chain.segments.flatMap(({ chainStart, proteinStart, length }) =>
      Array.from({ length }, (_unused, k) => {
        const column = Number(columnOfResidue(row, residueIndex(proteinStart + k))) + 1;
        const residue = residues[chainStart + k];
        return [residue?.label, residue?.letter, column, row.residues[proteinStart + k]];
      }),
    );
    expect(found).toEqual(job.mapping);
  });
});

test('1COW on γ alone: only chain G is mapped, its breaks end segments (44→77, 90→209 in the file)', async () => {
  const { chains, unmatched } = (await run(
    'map',
    '--structure',
    join(fixtures, 'structures/1cow.pdb'),
    '--alignment',
    join(fixtures, 'alignments/gamma_small_mafft.afa'),
  )) as MapOutput;
  expect(chains.map((chain) => chain.id)).toEqual(['G']);
  expect(unmatched).toEqual(['A', 'B', 'C', 'D', 'E', 'F']);
  expect(chains[0]?.segments).toEqual([
    { chainStart: 0, proteinStart: 0, length: 44 },
    { chainStart: 44, proteinStart: 76, length: 14 },
    { chainStart: 58, proteinStart: 208, length: 64 },
  ]);
  expect(chains[0]?.runnersUp.map((one) => one.row).sort()).toEqual(['ATPG_ECOLI', 'ATPG_VIBCH']);
});
