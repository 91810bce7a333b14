import type { Member, OwnProject, Project as ProjectContract, ProjectEvent } from '../../../shared/contracts';
import type { Role } from '../../../shared/permissions';
import type { AnnouncedEvent } from '../../db';
import type { Person } from '../auth';
import type { ProjectMember } from './project-member.entity';
import type { Project } from './project.entity';

export function presentProject(project: Project, teamName: string): ProjectContract {
  const { id, teamId, name, motorKind, readersMayComment, invented, version } = project;
  return { id, teamId, teamName, name, motorKind, readersMayComment, invented, version };
}

export function presentOwnProject(project: Project, teamName: string, role: Role, head: number): OwnProject {
  return { ...presentProject(project, teamName), role, head };
}

export function presentMember(member: ProjectMember, person: Person): Member {
  return {
    personId: member.personId,
    name: person.name,
    email: person.email,
    role: member.role,
    since: member.createdAt.toISOString(),
  };
}

export function presentEvent(event: AnnouncedEvent, actorName: string): ProjectEvent {
  return {
    projectId: event.projectId,
    eventNumber: event.eventNumber,
    kind: event.kind,
    subjectId: event.subjectId,
    actor: { id: event.actorId, name: actorName },
    at: event.at.toISOString(),
    payload: event.payload,
  };
}
