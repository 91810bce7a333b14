import { subject, subjectKey, type Subject } from '@/shared/contracts/threads';
import type { ResidueLabel } from '@/shared/contracts/common';
import { mutantPath, residuePath, structurePath } from '@/client/paths';

/** The subject that a key in an address names; null when it names none. */
export function subjectOfKey(key: string): Subject | null {
  const [kind, ...rest] = key.split(':');
  const given =
    kind === 'residue'
      ? { kind, proteinId: rest[0], residueIndex: Number(rest[1]) }
      : { kind, id: rest.join(':') };
  const parsed = subject.safeParse(given);
  return parsed.success && subjectKey(parsed.data) === key ? parsed.data : null;
}

export const subjectWords: Record<Subject['kind'], string> = {
  residue: 'residue',
  annotation: 'annotation',
  mutant: 'mutant',
  structure: 'structure',
};

/** Where the thing itself is shown; an annotation at its residue. */
export function subjectPath(projectId: string, of: Subject, residue: ResidueLabel | null): string | null {
  switch (of.kind) {
    case 'residue':
      return residuePath(projectId, of);
    case 'mutant':
      return mutantPath(projectId, of.id);
    case 'structure':
      return structurePath(projectId, of.id);
    case 'annotation':
      return residue && residuePath(projectId, residue);
  }
}
