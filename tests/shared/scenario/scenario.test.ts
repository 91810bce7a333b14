import { createHash } from 'node:crypto';
import { makeScenario } from '@/shared/scenario/scenario';

const hashOf = (value: unknown): string => createHash('sha256').update(JSON.stringify(value)).digest('hex');

it('is the same whenever it is made', () => {
  expect(hashOf(makeScenario())).toBe(hashOf(makeScenario()));
  expect(hashOf(makeScenario(3))).toBe(hashOf(makeScenario(3)));
});

it('has the same sequences on every machine', () => {
  // Integer arithmetic only, so a change here is a change of the demo.
  const { alignments, construct } = makeScenario();
  expect(hashOf([alignments, construct])).toBe(
    '7341a92f50586f7c2a914486da0312a62be554b7ce555f78f28cc090b59d077a',
  );
});

it('changes its residues with the seed, not its shape', () => {
  const [first, second] = [makeScenario(1), makeScenario(2)];
  const lengths = ({ alignments }: typeof first) =>
    alignments.map(({ rows }) => rows.map((row) => row.residues.length));
  expect(hashOf(first.alignments)).not.toBe(hashOf(second.alignments));
  expect(lengths(first)).toEqual(lengths(second));
  expect(first.structure.chains.map(({ id }) => id)).toEqual(second.structure.chains.map(({ id }) => id));
});

it('is plain data', () => {
  const scenario = makeScenario();
  expect(JSON.parse(JSON.stringify(scenario))).toEqual(scenario);
});

it('gives each organism one protein in each family', () => {
  const { alignments, organisms } = makeScenario();
  expect(alignments.map(({ family }) => family)).toEqual(['c', 'a', 'β', 'γ']);
  expect(organisms.length).toBeGreaterThanOrEqual(8);
  for (const { rows } of alignments) expect(rows.map(({ organism }) => organism)).toEqual(organisms);
});
