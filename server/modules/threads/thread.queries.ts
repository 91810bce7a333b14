import { LessThan, type EntityManager } from 'typeorm';
import {
  subjectKey,
  type Message as MessageContract,
  type Subject,
  type Thread as ThreadContract,
} from '../../../shared/contracts';
import type { UnitOfWork } from '../../db';
import type { PeopleDirectory } from '../auth';
import { Message } from './message.entity';
import type { SubjectDirectory } from './subject.directory';
import { Thread } from './thread.entity';

export function subjectOf(thread: Thread): Subject {
  if (thread.subjectKind === 'residue') {
    return { kind: 'residue', proteinId: thread.proteinId ?? '', residueIndex: thread.residueIndex ?? 0 };
  }
  return { kind: thread.subjectKind, id: thread.subjectId ?? '' };
}

export class ThreadQueries {
  constructor(
    private readonly unitOfWork: UnitOfWork,
    private readonly people: PeopleDirectory,
    private readonly subjects: SubjectDirectory,
  ) {}

  async presentMessages(messages: readonly Message[]): Promise<MessageContract[]> {
    const brief = await this.people.briefs(messages.map((message) => message.authorId));
    return messages.map(({ id, threadId, eventNumber, text, authorId, createdAt, clientKey }) => ({
      id,
      threadId,
      eventNumber,
      text,
      by: brief(authorId),
      at: createdAt.toISOString(),
      clientKey,
    }));
  }

  async present(
    threads: readonly Thread[],
    manager: EntityManager = this.unitOfWork.reader,
  ): Promise<ThreadContract[]> {
    const projectId = threads[0]?.projectId ?? '';
    const subjects = threads.map(subjectOf);
    const [last, resolved] = await Promise.all([
      threads.length === 0
        ? []
        : manager.find(Message, {
            where: threads.map((thread) => ({ threadId: thread.id, eventNumber: thread.lastEventNumber })),
          }),
      this.subjects.resolve(projectId, subjects),
    ]);
    const messages = await this.presentMessages(last);
    return threads.map((thread, at) => ({
      id: thread.id,
      subject: subjectOf(thread),
      subjectKey: thread.subjectKey,
      caption: resolved[at]?.caption ?? '',
      residue: resolved[at]?.residue ?? null,
      messageCount: thread.messageCount,
      lastMessage: messages.find((message) => message.threadId === thread.id) ?? null,
    }));
  }

  /** Latest spoken in first. */
  async list(projectId: string, before: number | undefined, limit: number) {
    const rows = await this.unitOfWork.reader.find(Thread, {
      where: { projectId, ...(before === undefined ? {} : { lastEventNumber: LessThan(before) }) },
      order: { lastEventNumber: 'DESC' },
      take: limit + 1,
    });
    const page = rows.slice(0, limit);
    return {
      threads: await this.present(page),
      next: rows.length > limit ? (page.at(-1)?.lastEventNumber ?? null) : null,
    };
  }

  /** The newest messages of a subject's main thread, oldest of them first. */
  async ofSubject(projectId: string, subject: Subject, before: number | undefined, limit: number) {
    const resolved = await this.subjects.mustResolve(projectId, subject);
    const row = await this.mainThread(projectId, subject);
    const found = row
      ? await this.unitOfWork.reader.find(Message, {
          where: { threadId: row.id, ...(before === undefined ? {} : { eventNumber: LessThan(before) }) },
          order: { eventNumber: 'DESC' },
          take: limit + 1,
        })
      : [];
    const page = found.slice(0, limit).reverse();
    const [thread] = row ? await this.present([row]) : [];
    return {
      thread: thread ?? null,
      caption: resolved.caption,
      residue: resolved.residue,
      messages: await this.presentMessages(page),
      earlier: found.length > limit ? (page[0]?.eventNumber ?? null) : null,
    };
  }

  mainThread(
    projectId: string,
    subject: Subject,
    manager: EntityManager = this.unitOfWork.reader,
  ): Promise<Thread | null> {
    return manager.findOneBy(Thread, { projectId, subjectKey: subjectKey(subject), main: true });
  }
}
