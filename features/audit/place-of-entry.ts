import { z } from 'zod';
import type { AuditEntry } from '@/shared/contracts/audit';
import {
  constructPath,
  familyPath,
  mutantPath,
  peoplePath,
  proteinPath,
  residuePath,
  uploadPath,
} from '@/client/paths';

const pinned = z.object({
  pins: z.array(z.object({ proteinId: z.uuid(), residueIndex: z.int().min(0) })).min(1),
});
const pages: Readonly<Record<string, (projectId: string, id: string) => string>> = {
  mutant: mutantPath,
  construct: constructPath,
  upload: uploadPath,
  protein: proteinPath,
  family: familyPath,
  person: (projectId) => peoplePath(projectId),
};

/** Where what was done can be looked at; undefined for what has no page of its own. */
export function placeOfEntry(projectId: string, entry: AuditEntry): string | undefined {
  const first = pinned.safeParse(entry.after).data?.pins[0];
  return first ? residuePath(projectId, first) : pages[entry.subjectKind]?.(projectId, entry.subjectId);
}
