import type { Act } from '../../../shared/permissions';
import { conflict, unusable } from '../../lib/problem';
import type { Annotation } from './annotation.entity';

type Status = Annotation['status'];

/** proposed → accepted or contested → retired; a retired one can be proposed again. Nothing is deleted. */
const steps: Record<Status, Status[]> = {
  proposed: ['accepted', 'contested', 'retired'],
  accepted: ['contested', 'retired'],
  contested: ['accepted', 'retired', 'proposed'],
  retired: ['proposed'],
};

export const actOfStatus: Record<Status, Act> = {
  accepted: 'accept annotation',
  contested: 'contest annotation',
  retired: 'retire annotation',
  proposed: 'retire annotation',
};

export function checkStatusStep(from: Status, to: Status, reason: string): void {
  if (!steps[from].includes(to)) {
    throw conflict('no-such-step', `An annotation that is ${from} cannot become ${to}.`);
  }
  if ((to === 'contested' || to === 'retired') && reason.trim() === '') {
    throw unusable('reason-needed', `Say why it is ${to}: the others want to know.`, {
      fields: [{ path: 'reason', message: 'Write a reason.' }],
    });
  }
}

export const shapeOf = (pinCount: number): Annotation['shape'] =>
  pinCount === 1 ? 'point' : pinCount === 2 ? 'pair' : 'set';
