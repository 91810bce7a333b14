import { readAlignment } from '@/shared/sequence/alignment/read-alignment';
import type { AlignmentRow } from '@/shared/sequence/alignment/types';
import type { CandidateProtein, ChainMap, MappableChain } from '@/shared/sequence/mapping/chain-types';
import { mapChainTo } from '@/shared/sequence/mapping/map-chain';
import { matchChains } from '@/shared/sequence/mapping/match-chains';
import type { GapRules } from '@/shared/sequence/mapping/pairwise';
import { proposeProtein } from '@/shared/sequence/mapping/propose-protein';
import type { Issue, ParseResult } from '@/shared/sequence/parse-result';
import { readPdb } from '@/shared/structure/pdb/read-pdb';
import { done, unusable, type Command } from '../command';
import { gapRulesOf, GAP_OPTIONS } from '../gap-options';
import { readOptions, requiredOption } from '../options';
import { readInput } from '../read-input';
import { UsageError } from '../command';

type FileIssue = Issue & { file?: string };

interface MappedChain {
  chain: MappableChain;
  best: ChainMap | null;
  others: ChainMap[];
  /** Why a chain stays without a protein. */
  words: string;
}

async function readFileWith<T>(
  path: string,
  read: (bytes: Uint8Array) => ParseResult<T>,
): Promise<{ value: T | null; issues: FileIssue[] }> {
  const input = await readInput(path);
  const { value, issues } = input.value === null ? { value: null, issues: input.issues } : read(input.value);
  return { value, issues: issues.map((issue) => ({ ...issue, file: path })) };
}

const candidateOf = (row: AlignmentRow, index: number): CandidateProtein => ({
  id: String(index),
  name: row.name,
  family: 'alignment',
  residues: row.residues,
});

function forceRow(chain: MappableChain, protein: CandidateProtein, rules: GapRules): MappedChain {
  const best = mapChainTo(chain, protein, rules);
  return { chain, best, others: [], words: 'The chain and the row are too long to be aligned.' };
}

function matchRows(
  chains: readonly MappableChain[],
  rows: readonly CandidateProtein[],
  rules: GapRules,
): MappedChain[] {
  return matchChains(chains, rows, { rules, alignedPerFamily: 8 }).map((match) => {
    const proposal = proposeProtein(match, rows);
    const best = proposal.outcome === 'matched' ? proposal.best : null;
    return { chain: match.chain, best, others: match.maps.slice(1), words: proposal.words };
  });
}

function printedMap(
  chain: MappableChain,
  map: ChainMap,
  others: readonly ChainMap[],
  names: Map<string, string>,
) {
  const rowOf = ({ proteinId }: ChainMap) => names.get(proteinId) ?? proteinId;
  const mismatches = map.exceptions
    .filter((exception) => exception.kind === 'mismatch' || exception.kind === 'engineered')
    .map(({ label, chainLetter, proteinIndex, proteinLetter }) => ({
      label,
      chainLetter,
      proteinIndex,
      proteinLetter,
    }));
  const exceptions = map.exceptions.map(({ kind, label }) => ({ kind, label }));
  const runnersUp = others.map((other) => ({ row: rowOf(other), identity: other.identity }));
  const { identity, coverage, segments, score } = map;
  return {
    id: chain.id,
    row: rowOf(map),
    score,
    identity,
    coverage,
    segments,
    mismatches,
    exceptions,
    runnersUp,
  };
}

export const map: Command = {
  name: 'map',
  summary: 'maps the protein chains of a coordinate file on the rows of an alignment',
  usage: [
    'core map --structure FILE --alignment FILE [--row NAME] [--open 10] [--extend 0.5]',
    'Files as in structure and alignment. --row: this row for every protein chain, without thresholds.',
    'Prints chains: [{ id, row, identity, coverage, segments: [{ chainStart, proteinStart, length }], mismatches:',
    '[{ label, chainLetter, proteinIndex, proteinLetter }], runnersUp: [{ row, identity }] }], unmatched: [id], issues.',
    'Indices from 0; a segment ends at every unobserved stretch. A chain below 95 % identity or 80 % coverage is',
    'listed as unmatched, with the reason as a warning.',
  ].join('\n'),
  async run(args) {
    const options = readOptions(args, {
      ...GAP_OPTIONS,
      structure: 'text',
      alignment: 'text',
      row: 'text',
    });
    const structurePath = requiredOption(options, 'structure');
    const alignmentPath = requiredOption(options, 'alignment');
    if (options.positionals.length > 0)
      throw new UsageError('map takes its files as --structure and --alignment');
    if (structurePath === '-' && alignmentPath === '-')
      throw new UsageError('only one file can be standard input');
    const rules = gapRulesOf(options);
    const structure = await readFileWith(structurePath, (bytes) => readPdb(bytes));
    const alignment = await readFileWith(alignmentPath, (bytes) => readAlignment(bytes));
    const issues = [...structure.issues, ...alignment.issues];
    if (structure.value === null || alignment.value === null) return unusable(issues);

    const rows = alignment.value.rows.map(candidateOf);
    const chains: MappableChain[] = structure.value.chains.filter((chain) => chain.kind === 'protein');
    const rowName = options.text('row');
    const forced = rows.find((row) => row.name === rowName);
    if (rowName !== undefined && forced === undefined) {
      const message = `The alignment has no row "${rowName}". Its rows: ${rows.map((row) => row.name).join(', ')}.`;
      return unusable([
        ...issues,
        { code: 'row-unknown', severity: 'error', message: message.slice(0, 2000) },
      ]);
    }
    const mapped =
      forced === undefined
        ? matchRows(chains, rows, rules)
        : chains.map((chain) => forceRow(chain, forced, rules));
    const names = new Map(rows.map((row) => [row.id, row.name]));
    const unmatched = mapped.filter((one) => one.best === null);
    for (const { chain, words } of unmatched)
      issues.push({ code: 'chain-unmatched', severity: 'warning', chain: chain.id, message: words });
    return done({
      chains: mapped.flatMap(({ chain, best, others }) =>
        best === null ? [] : [printedMap(chain, best, others, names)],
      ),
      unmatched: unmatched.map(({ chain }) => chain.id),
      issues,
    });
  },
};
