import { motorWords, type MotorKind } from '@/features/projects/motor-words.data';
import { motorFamilies } from '@/server/modules/families/motor-families.data';

it.each(['F', 'V', 'A'] satisfies MotorKind[])(
  'names the families that a %s-type project starts with',
  (kind) => {
    expect(motorWords[kind].families).toEqual(motorFamilies[kind].map(({ name }) => name));
  },
);
