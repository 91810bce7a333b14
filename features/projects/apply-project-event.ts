import type { Member, OwnProject } from '@/shared/contracts/projects';
import type { Applied, Fact } from '@/client/facts';
import { byText, putBy } from '@/client/keep-newer';

/** One's own view of a project: what it is, and one's role in it. Its `head` stays as it was read. */
export function applyToOwnProject(own: OwnProject, fact: Fact, personId: string): OwnProject {
  if (fact.kind === 'project.changed') {
    const isNewer = fact.payload.id === own.id && fact.payload.version > own.version;
    return isNewer ? { ...own, ...fact.payload } : own;
  }
  if (fact.kind === 'member.changed' || fact.kind === 'member.added') {
    const { role } = fact.payload;
    return fact.payload.personId === personId && role !== own.role ? { ...own, role } : own;
  }
  return own;
}

/** The projects of one person; the fact is of the project `projectId`. */
export function applyToProjects(
  list: OwnProject[],
  fact: Fact,
  projectId: string,
  personId: string,
): OwnProject[] {
  const at = list.findIndex(({ id }) => id === projectId);
  const own = list[at];
  if (!own) return list;
  if (fact.kind === 'member.removed' && fact.payload.personId === personId) {
    return list.filter(({ id }) => id !== projectId);
  }
  const next = applyToOwnProject(own, fact, personId);
  return next === own ? list : list.map((project) => (project === own ? next : project));
}

/** Members in the order in which they came. */
export function applyToMembers(list: Member[], fact: Fact): Applied<Member[]> {
  if (fact.kind === 'member.removed') {
    const { personId } = fact.payload;
    return list.some((member) => member.personId === personId)
      ? list.filter((member) => member.personId !== personId)
      : list;
  }
  if (fact.kind !== 'member.added' && fact.kind !== 'member.changed') return list;
  const next = fact.payload;
  return putBy(
    list,
    next,
    (member) => member.personId === next.personId,
    (one, other) => byText(one.since, other.since) || byText(one.personId, other.personId),
    (old) => (old.role === next.role && old.name === next.name && old.since === next.since ? old : next),
  );
}
