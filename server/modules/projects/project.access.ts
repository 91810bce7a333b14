import { can, type Act, type Circumstances, type Role } from '../../../shared/permissions';
import type { UnitOfWork } from '../../db';
import { forbidden, notFound } from '../../lib/problem';
import { ProjectMember } from './project-member.entity';
import { Project } from './project.entity';

export interface Membership {
  project: Project;
  role: Role;
}

/** The only way to a project on someone's behalf. What is missing and what may not be seen answer the same. */
export class ProjectAccess {
  constructor(private readonly unitOfWork: UnitOfWork) {}

  async membership(personId: string, projectId: string): Promise<Membership> {
    const member = await this.unitOfWork.reader.findOneBy(ProjectMember, { projectId, personId });
    const project = member && (await this.unitOfWork.reader.findOneBy(Project, { id: projectId }));
    if (!member || !project) throw notFound('project');
    return { project, role: member.role };
  }

  /** Membership with the right to do `act`; a member without it is told so. */
  async may(
    personId: string,
    projectId: string,
    act: Act,
    circumstances: Circumstances = {},
  ): Promise<Membership> {
    const membership = await this.membership(personId, projectId);
    const { readersMayComment } = membership.project;
    if (!can(membership.role, act, { readersMayComment, ...circumstances })) {
      throw forbidden(
        `As ${membership.role} of this project you may not do this (${act}). Ask a lead of the project.`,
      );
    }
    return membership;
  }

  /** For sockets and running jobs: is this person a member now, and as what. */
  async roleOf(personId: string, projectId: string): Promise<Role | null> {
    const member = await this.unitOfWork.reader.findOneBy(ProjectMember, { projectId, personId });
    return member?.role ?? null;
  }
}
