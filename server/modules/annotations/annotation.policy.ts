import { annotationSteps } from '../../../shared/contracts';
import { conflict, unusable } from '../../lib/problem';
import type { Annotation } from './annotation.entity';

type Status = Annotation['status'];

export function checkStatusStep(from: Status, to: Status, reason: string): void {
  if (!annotationSteps[from].includes(to)) {
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
