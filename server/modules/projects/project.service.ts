import type { z } from 'zod';
import type {
  Member,
  newProjectBody,
  OwnProject,
  Project as ProjectContract,
  projectSettingsBody,
} from '../../../shared/contracts';
import type { Role } from '../../../shared/permissions';
import type { Unit, UnitOfWork } from '../../db';
import { newId } from '../../lib/new-id';
import { conflict, notFound, stale, unusable } from '../../lib/problem';
import type { PeopleDirectory } from '../auth';
import type { TeamDirectory } from '../teams';
import { ProjectMember } from './project-member.entity';
import type { ProjectAccess } from './project.access';
import { Project } from './project.entity';
import { presentMember, presentOwnProject, presentProject } from './project.presenter';

/** What other modules put into a project when it is made, in the same unit. */
export type ProjectFurnisher = (unit: Unit, project: Project) => Promise<void>;

export class ProjectService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly access: ProjectAccess,
    private readonly people: PeopleDirectory,
    private readonly teams: TeamDirectory,
    private readonly furnish: ProjectFurnisher,
  ) {}

  async make(personId: string, body: z.infer<typeof newProjectBody>, invented = false): Promise<OwnProject> {
    const team = await this.teams.ledBy(personId, body.teamId);
    return this.unitOfWork.write({ projectId: null, actorId: personId }, async (unit) => {
      const project = unit.manager.create(Project, {
        id: newId(),
        ...body,
        readersMayComment: false,
        invented,
        createdAt: unit.at,
        createdBy: personId,
      });
      await unit.manager.save(project);
      await unit.openStream(project.id);
      await unit.manager.insert(ProjectMember, this.row(unit, project.id, personId, 'lead'));
      await this.furnish(unit, project);
      await unit.audit({
        action: 'project.made',
        subjectKind: 'project',
        subjectId: project.id,
        after: body,
      });
      return presentOwnProject(project, team.name, 'lead', unit.nextEventNumber - 1);
    });
  }

  async change(
    personId: string,
    projectId: string,
    version: number,
    body: z.infer<typeof projectSettingsBody>,
  ): Promise<ProjectContract> {
    await this.access.may(personId, projectId, 'change settings');
    return this.unitOfWork.write({ projectId }, async (unit) => {
      const project = await unit.manager.findOneByOrFail(Project, { id: projectId });
      const teamName = (await this.teams.names([project.teamId])).get(project.teamId) ?? '';
      if (project.version !== version) throw stale(presentProject(project, teamName));
      const before = { name: project.name, readersMayComment: project.readersMayComment };
      await unit.manager.save(Object.assign(project, body));
      const presented = presentProject(project, teamName);
      await unit.audit({
        action: 'project.changed',
        subjectKind: 'project',
        subjectId: projectId,
        before,
        after: body,
      });
      unit.announce('project.changed', projectId, presented);
      return presented;
    });
  }

  async addMember(personId: string, projectId: string, email: string, role: Role): Promise<Member> {
    await this.access.may(personId, projectId, 'manage members');
    const person = await this.people.byEmail(email);
    if (!person) {
      throw unusable(
        'no-account',
        'Nobody has an account under this address yet. Ask them to sign up first, then add them.',
        {
          fields: [{ path: 'email', message: 'No account under this address.' }],
        },
      );
    }
    return this.unitOfWork.write({ projectId }, async (unit) => {
      if (await unit.manager.existsBy(ProjectMember, { projectId, personId: person.id })) {
        throw conflict('already-member', `${person.name} is a member already.`);
      }
      const row = unit.manager.create(ProjectMember, this.row(unit, projectId, person.id, role));
      await unit.manager.insert(ProjectMember, row);
      const member = presentMember(row, person);
      await unit.audit({
        action: 'member.added',
        subjectKind: 'person',
        subjectId: person.id,
        after: { role },
      });
      unit.announce('member.added', person.id, member);
      return member;
    });
  }

  async changeMember(personId: string, projectId: string, memberId: string, role: Role): Promise<Member> {
    await this.access.may(personId, projectId, 'manage members');
    return this.unitOfWork.write({ projectId }, async (unit) => {
      const row = await this.memberRow(unit, projectId, memberId);
      if (row.role === 'lead' && role !== 'lead') await this.keepOneLead(unit, projectId);
      const before = row.role;
      await unit.manager.update(ProjectMember, { projectId, personId: memberId }, { role });
      const person = (await this.people.byIds([memberId])).get(memberId);
      if (!person) throw notFound('member');
      const member = presentMember(Object.assign(row, { role }), person);
      await unit.audit({
        action: 'member.changed',
        subjectKind: 'person',
        subjectId: memberId,
        before: { role: before },
        after: { role },
      });
      unit.announce('member.changed', memberId, member);
      return member;
    });
  }

  async removeMember(personId: string, projectId: string, memberId: string): Promise<{ personId: string }> {
    await this.access.may(personId, projectId, 'manage members');
    return this.unitOfWork.write({ projectId }, async (unit) => {
      const row = await this.memberRow(unit, projectId, memberId);
      if (row.role === 'lead') await this.keepOneLead(unit, projectId);
      await unit.manager.delete(ProjectMember, { projectId, personId: memberId });
      await unit.audit({
        action: 'member.removed',
        subjectKind: 'person',
        subjectId: memberId,
        before: { role: row.role },
      });
      unit.announce('member.removed', memberId, { personId: memberId });
      return { personId: memberId };
    });
  }

  private row(unit: Unit, projectId: string, personId: string, role: Role) {
    return { projectId, personId, role, createdAt: unit.at, createdBy: unit.actorId };
  }

  private async memberRow(unit: Unit, projectId: string, personId: string): Promise<ProjectMember> {
    const row = await unit.manager.findOneBy(ProjectMember, { projectId, personId });
    if (!row) throw notFound('member');
    return row;
  }

  /** The unit holds the project's lock, so the count cannot change under it. */
  private async keepOneLead(unit: Unit, projectId: string): Promise<void> {
    if ((await unit.manager.countBy(ProjectMember, { projectId, role: 'lead' })) < 2) {
      throw conflict('last-lead', 'A project always has at least one lead. Make somebody else a lead first.');
    }
  }
}
