// Real files with bytes changed, through every reader of the core: no throw, no hang, always coded issues.
import { readFileSync } from 'node:fs';
import path from 'node:path';
import { proposeMaps } from '@/server/jobs/workers/propose-maps';
import { newChain } from '@/server/jobs/workers/chain-rows';
import { readAddress } from '@/shared/sequence/address/read-address';
import { readAlignment } from '@/shared/sequence/alignment/read-alignment';
import { readCoding } from '@/shared/sequence/construct/coding';
import { matchProtein } from '@/shared/sequence/construct/match-protein';
import { checkMutant } from '@/shared/sequence/construct/mutation-check';
import { parseMutations } from '@/shared/sequence/construct/mutation';
import { readDna, readDnaRecords } from '@/shared/sequence/construct/read-dna';
import { sequenceNumbering } from '@/shared/sequence/numbering/numbering';
import type { Issue, ParseResult } from '@/shared/sequence/parse-result';
import { readPdb } from '@/shared/structure/pdb/read-pdb';
import { between, pick, seeded } from '@/tests/support/random';
import { isFull, report } from '@/tests/support/size';
import { mutateBytes } from './support/mutate-bytes';

const seed = Number(process.env.FUZZ_SEED ?? 20260404);
const times = isFull ? 30 : 1;
const hangsAfterMilliseconds = 2000;
const fixture = (name: string) => readFileSync(path.join(__dirname, '../fixtures', name));

function expectCoded(issues: readonly Issue[]): void {
  for (const { code, severity, message, line, column } of issues) {
    expect(code).toMatch(/^[a-z0-9]+(-[a-z0-9]+)*$/);
    expect(['error', 'warning']).toContain(severity);
    expect(message.trim()).not.toBe('');
    for (const place of [line, column]) {
      if (place !== undefined) expect(Number.isInteger(place) && place >= 1).toBe(true);
    }
  }
}

/** What every reader promises: a value without errors, or errors without a value. */
function expectResult<Value>({ value, issues }: ParseResult<Value>): Value | null {
  expectCoded(issues);
  expect(value === null).toBe(issues.some(({ severity }) => severity === 'error'));
  return value;
}

/** Runs it on mutated bytes; says which seed brings the same again. */
function fuzz(
  name: string,
  count: number,
  sources: readonly Buffer[],
  run: (bytes: Buffer, random: () => number) => void,
) {
  let slowest = 0;
  const began = Date.now();
  for (let at = 0; at < count; at += 1) {
    const own = seed + at;
    const random = seeded(own);
    const bytes = mutateBytes(random, pick(random, sources));
    const start = performance.now();
    try {
      run(bytes, random);
    } catch (error) {
      report(
        `${name}: FUZZ_SEED=${own} fails on ${bytes.length} bytes ${JSON.stringify(bytes.toString('latin1').slice(0, 300))}`,
      );
      throw error;
    }
    slowest = Math.max(slowest, performance.now() - start);
  }
  report(`${name}: ${count} in ${Date.now() - began} ms, slowest ${Math.round(slowest)} ms, seed ${seed}`);
  expect(slowest).toBeLessThan(hangsAfterMilliseconds);
}

test('alignments', () => {
  const sources = ['c_small_mafft.afa', 'gamma_small_mafft.afa', 'delta_mafft.afa'].map((name) =>
    fixture(`alignments/${name}`),
  );
  let read = 0;
  fuzz('alignments', 1000 * times, sources, (bytes) => {
    const value = expectResult(readAlignment(bytes));
    if (!value) return;
    read += 1;
    for (const row of value.rows) {
      expect(row.text).toHaveLength(value.columnCount);
      // A row is its residues and its gaps.
      expect(
        row.text
          .replace(/[^A-Za-z*]/g, '')
          .toUpperCase()
          .replace(/\*/g, ''),
      ).toBe(row.residues);
      expect(row.segments.reduce((sum, { length }) => sum + length, 0)).toBe(row.residues.length);
    }
  });
  expect(read).toBeGreaterThan(50);
});

test('coordinate files, and what is proposed for their chains', () => {
  const sources = ['1A8O.pdb', '2BEG.pdb', '2oxl.pdb', 'a_structure.pdb', 'disordered.pdb', '1LCD.pdb'].map(
    (name) => fixture(`structures/${name}`),
  );
  const rows = readAlignment(fixture('alignments/c_small_mafft.afa')).value?.rows ?? [];
  const candidates = rows.map(({ name, residues }) => ({ id: name, name, family: 'c', residues }));
  let read = 0;
  fuzz('coordinate files', 200 * times, sources, (bytes) => {
    const value = expectResult(readPdb(bytes));
    if (!value) return;
    read += 1;
    const maps = proposeMaps(value.chains, candidates, () => {});
    for (const chain of value.chains) {
      const stored = newChain(chain);
      expect(stored.labels.reduce((sum, { length }) => sum + length, 0)).toBe(chain.residues.length);
      expect(maps.has(chain.id)).toBe(chain.kind === 'protein');
    }
  });
  expect(read).toBeGreaterThan(50);
});

test('DNA, the part of it that codes, and the protein in it', () => {
  const whole = fixture('dna/vcholerae_atp_cds.fasta');
  const one = Buffer.from(`>${whole.toString('latin1').split(/^>/m)[1] ?? ''}`);
  const protein = readAlignment(fixture('alignments/c_small_mafft.afa')).value?.rows[0]?.residues ?? '';
  fuzz('DNA', 400 * times, [one, one, whole], (bytes, random) => {
    const text = bytes.toString(random() < 0.5 ? 'utf8' : 'latin1');
    expectResult(readDnaRecords(text));
    const dna = expectResult(readDna(text));
    if (!dna) return;
    const coding = expectResult(
      readCoding({
        bases: dna.bases,
        circular: random() < 0.5,
        start: between(random, -2, dna.bases.length + 2),
        table: pick(random, [1, 2, 3, 4, 5, 11] as const),
        ...(random() < 0.3 && { end: between(random, 0, dna.bases.length + 2) }),
        strand: pick(random, ['+', '-'] as const),
      }),
    );
    if (coding) expectResult(matchProtein(coding, protein, { bases: dna.bases }));
  });
});

const addresses = [
  'cE62',
  'c62',
  'A:62',
  'gamma-R75 @ Bos taurus',
  'βE188Q',
  '#52A',
  'c.62 {mature}',
  'chain A 62',
  'Glu62',
  'c′Q12-4',
];
test('addresses', () => {
  const context = {
    families: ['c', 'c′', 'γ', 'β', 'a', 'OSCP'].map((name) => ({
      name,
      aliases: name === 'γ' ? ['gamma'] : [],
    })),
    chainIds: ['A', 'B', 'a', '1', 'AA'],
  };
  fuzz(
    'addresses',
    4000 * times,
    addresses.map((text) => Buffer.from(text)),
    (bytes, random) => {
      const { readings, notReadAs } = readAddress(
        bytes.toString(random() < 0.7 ? 'utf8' : 'latin1'),
        context,
      );
      for (const { group, reason, spelling, label } of readings) {
        for (const words of [group, reason, spelling, label]) expect(words.trim()).not.toBe('');
        // The spelling it offers leads back to it.
        expect(readAddress(spelling, context).readings.length).toBeGreaterThan(0);
      }
      for (const words of notReadAs) expect(words.trim()).not.toBe('');
    },
  );
});

const mutations = [
  'E62Q',
  'Glu62Gln',
  'E62Q+D44N',
  'E62Q, D44N; R41K',
  'A-4C',
  'p.Glu62Gln',
  'E52AK',
  'E62*',
  'del62',
];
test('mutations', () => {
  const protein = readAlignment(fixture('alignments/c_small_mafft.afa')).value?.rows[0]?.residues ?? '';
  const numbering = sequenceNumbering(protein.length);
  fuzz(
    'mutations',
    4000 * times,
    mutations.map((text) => Buffer.from(text)),
    (bytes, random) => {
      const requests = expectResult(parseMutations(bytes.toString(random() < 0.7 ? 'utf8' : 'latin1')));
      for (const request of requests ?? []) expectCoded(checkMutant(request, protein, numbering).issues);
    },
  );
});
