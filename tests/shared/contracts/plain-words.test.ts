// What a refused request says where its schema has no words of its own: which value, and what is expected of it.
import { newAnnotationBody } from '@/shared/contracts/annotations';
import { newConstructBody } from '@/shared/contracts/plans';
import { newProjectBody } from '@/shared/contracts/projects';

const words = (result: { error?: { issues: { message: string }[] } }) =>
  result.error?.issues.map(({ message }) => message);

test('name the value and what it must be', () => {
  expect(words(newProjectBody.safeParse({ teamId: 'x', name: '', motorKind: 'Q', more: 1 }))).toEqual([
    'teamId is not in the expected form (uuid).',
    'Write a name.',
    'motorKind must be one of: F, V, A.',
    'Not known here: more.',
  ]);
  expect(words(newConstructBody.safeParse({ name: 5, codingStart: NaN, circular: 'x' }))).toEqual([
    'name must be text.',
    'dna is missing.',
    'codingStart must be a number.',
    'circular must be true or false.',
    'geneticCode is missing.',
    'proteinId is missing.',
  ]);
  expect(words(newConstructBody.safeParse([]))).toEqual(['This must be an object.']);
});

test('say limits with their unit', () => {
  const pin = { proteinId: '01900000-0000-7000-8000-000000000001', residueIndex: -1 };
  const body = { kind: 'note', text: 'x', confidence: 'low', evidence: [] };
  expect(words(newAnnotationBody.safeParse({ ...body, pins: [pin] }))).toEqual([
    'pins.0.residueIndex must be at least 0.',
  ]);
  expect(words(newAnnotationBody.safeParse({ ...body, pins: [] }))).toEqual([
    'pins must have at least 1 entry.',
  ]);
});
