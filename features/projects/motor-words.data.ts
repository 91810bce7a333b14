import type { z } from 'zod';
import type { motorKind } from '@/shared/contracts/projects';

export type MotorKind = z.infer<typeof motorKind>;

interface MotorWords {
  title: string;
  /** Where such motors are found and what they do. */
  found: string;
  /** Names of the families a project of this kind starts with. */
  families: readonly string[];
}

/** The three kinds of rotary ATPase as one chooses between them. Held against what a new project gets by a test. */
export const motorWords: Record<MotorKind, MotorWords> = {
  F: {
    title: 'F-type',
    found: 'ATP synthases of bacteria, mitochondria and chloroplasts.',
    families: ['c', 'γ', 'ε', 'a', 'α', 'β', 'b', 'δ'],
  },
  V: {
    title: 'V-type',
    found: 'Ion pumps of vacuoles and other membranes of cells with a nucleus.',
    families: ['c', 'c′', 'c″', 'D', 'F', 'd', 'a', 'A', 'B', 'E', 'G', 'C', 'H', 'e'],
  },
  A: {
    title: 'A-type',
    found: 'ATP synthases of archaea and some bacteria, often called V/A-type.',
    families: ['c', 'D', 'F', 'C', 'a', 'A', 'B', 'E', 'G'],
  },
};
