import type { z } from 'zod';
import { subjectKey, type newMessageBody, type Subject } from '../../../shared/contracts';
import type { Unit, UnitOfWork } from '../../db';
import { newId } from '../../lib/new-id';
import { conflict } from '../../lib/problem';
import type { ProjectAccess } from '../projects';
import { Message } from './message.entity';
import type { SubjectDirectory } from './subject.directory';
import { Thread } from './thread.entity';
import type { ThreadQueries } from './thread.queries';

export class ThreadService {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly projects: ProjectAccess,
    private readonly subjects: SubjectDirectory,
    private readonly queries: ThreadQueries,
  ) {}

  /** A message's order is its event number. Sent again with the same client key, it is the same message. */
  async post(
    personId: string,
    projectId: string,
    { clientKey, subject, text }: z.infer<typeof newMessageBody>,
  ) {
    await this.projects.may(personId, projectId, 'comment');
    await this.subjects.mustResolve(projectId, subject);
    return this.unitOfWork.write({ projectId, actorId: personId }, async (unit) => {
      const sent = await unit.manager.findOneBy(Message, { authorId: personId, clientKey });
      if (sent) return this.again(unit, sent, { projectId, subject, text });
      const eventNumber = unit.nextEventNumber;
      const thread = await this.threadFor(unit, projectId, subject);
      Object.assign(thread, { messageCount: thread.messageCount + 1, lastEventNumber: eventNumber });
      await unit.manager.save(thread);
      const message = unit.manager.create(Message, {
        threadId: thread.id,
        eventNumber,
        id: newId(),
        authorId: personId,
        clientKey,
        text,
        createdAt: unit.at,
      });
      await unit.manager.insert(Message, message);
      const posted = await this.presentOne(unit, thread, message);
      unit.announce('message.posted', message.id, posted);
      return posted;
    });
  }

  /** Sent again: the same answer, unless it is another message under a used key. */
  private async again(
    unit: Unit,
    sent: Message,
    { projectId, subject, text }: { projectId: string; subject: Subject; text: string },
  ) {
    const thread = await unit.manager.findOneByOrFail(Thread, { id: sent.threadId });
    if (thread.projectId !== projectId || thread.subjectKey !== subjectKey(subject) || sent.text !== text) {
      throw conflict('key-reused', 'This client key belongs to another message. Send it under a new key.');
    }
    return this.presentOne(unit, thread, sent);
  }

  private async presentOne(unit: Unit, row: Thread, sent: Message) {
    const [thread] = await this.queries.present([row], unit.manager);
    const [message] = await this.queries.presentMessages([sent]);
    if (!thread || !message) throw new Error('The message just written cannot be read.');
    return { thread, message };
  }

  private async threadFor(unit: Unit, projectId: string, subject: Subject): Promise<Thread> {
    const known = await this.queries.mainThread(projectId, subject, unit.manager);
    if (known) return known;
    return unit.manager.create(Thread, {
      id: newId(),
      projectId,
      subjectKind: subject.kind,
      subjectId: subject.kind === 'residue' ? null : subject.id,
      proteinId: subject.kind === 'residue' ? subject.proteinId : null,
      residueIndex: subject.kind === 'residue' ? subject.residueIndex : null,
      subjectKey: subjectKey(subject),
      main: true,
      messageCount: 0,
      lastEventNumber: 0,
      createdAt: unit.at,
      createdBy: unit.actorId,
    });
  }
}
