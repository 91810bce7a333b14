import { In } from 'typeorm';
import type { Member, OwnProject, ProjectEvent } from '../../../shared/contracts';
import { ProjectEventRow, StreamHead } from '../../db/entities';
import type { AnnouncedEvent, UnitOfWork } from '../../db';
import type { PeopleDirectory } from '../auth';
import type { TeamDirectory } from '../teams';
import { ProjectMember } from './project-member.entity';
import { presentEvent, presentMember, presentOwnProject } from './project.presenter';
import { Project } from './project.entity';

/** Further behind than this, reading everything again is quicker. */
const eventsAtMost = 10_000;
const eventsAtOnce = 500;

export class ProjectQueries {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly people: PeopleDirectory,
    private readonly teams: TeamDirectory,
  ) {}

  async ofPerson(personId: string): Promise<OwnProject[]> {
    const reader = this.unitOfWork.reader;
    const memberships = await reader.findBy(ProjectMember, { personId });
    const ids = memberships.map((member) => member.projectId);
    const [projects, heads] = await Promise.all([
      reader.find(Project, { where: { id: In(ids) }, order: { id: 'ASC' } }),
      reader.findBy(StreamHead, { projectId: In(ids) }),
    ]);
    const names = await this.teams.names(projects.map((project) => project.teamId));
    return projects.map((project) =>
      presentOwnProject(
        project,
        names.get(project.teamId) ?? '',
        memberships.find((member) => member.projectId === project.id)?.role ?? 'reader',
        heads.find((head) => head.projectId === project.id)?.eventNumber ?? 0,
      ),
    );
  }

  async head(projectId: string): Promise<number> {
    const row = await this.unitOfWork.reader.findOneBy(StreamHead, { projectId });
    return row?.eventNumber ?? 0;
  }

  async members(projectId: string): Promise<Member[]> {
    const rows = await this.unitOfWork.reader.find(ProjectMember, {
      where: { projectId },
      order: { createdAt: 'ASC', personId: 'ASC' },
    });
    const people = await this.people.byIds(rows.map((row) => row.personId));
    return rows.flatMap((row) => {
      const person = people.get(row.personId);
      return person ? [presentMember(row, person)] : [];
    });
  }

  /** What happened after event `after`, at most some hundreds at once. */
  async eventsAfter(projectId: string, after: number) {
    const head = await this.head(projectId);
    if (head - after > eventsAtMost || after > head) return { events: [], head, readAfresh: true };
    const rows = await this.unitOfWork.reader
      .createQueryBuilder(ProjectEventRow, 'event')
      .where('event.projectId = :projectId AND event.eventNumber > :after', { projectId, after })
      .orderBy('event.eventNumber', 'ASC')
      .limit(eventsAtOnce)
      .getMany();
    return { events: await this.present(rows as AnnouncedEvent[]), head, readAfresh: false };
  }

  async present(events: readonly AnnouncedEvent[]): Promise<ProjectEvent[]> {
    const people = await this.people.byIds(events.map((event) => event.actorId));
    return events.map((event) => presentEvent(event, people.get(event.actorId)?.name ?? ''));
  }
}
