import { readFileSync } from 'node:fs';
import path from 'node:path';
import { makeAlignments } from '@/shared/scenario/families';
import { demoSeed } from '@/shared/scenario/scenario';
import { readAlignment } from '@/shared/sequence/alignment/read-alignment';
import { sample } from '@/features/find/sample.data';

const text = readFileSync(path.join('public/samples', sample.fileName), 'utf8');

it('is the invented alignment that the demo holds for this family', () => {
  const made = makeAlignments(demoSeed).find(({ family }) => family === sample.family);
  expect(text).toBe(made?.text);
});

it('is read without a complaint, with as many rows as the button says', () => {
  const { value, issues } = readAlignment(new TextEncoder().encode(text));
  expect(issues).toEqual([]);
  expect(value?.rows).toHaveLength(sample.rowCount);
});
