import { z } from 'zod';
import { eventNumber, id, indexFromZero, moment, personBrief, projectParams, residueLabel } from './common';
import { endpoint } from './endpoint';

/** What a thread hangs on. */
export const subject = z.discriminatedUnion('kind', [
  z.strictObject({ kind: z.literal('residue'), proteinId: id, residueIndex: indexFromZero }),
  z.strictObject({ kind: z.literal('annotation'), id }),
  z.strictObject({ kind: z.literal('mutant'), id }),
  z.strictObject({ kind: z.literal('structure'), id }),
]);
export type Subject = z.infer<typeof subject>;

/** The subject as text: one main thread a subject, whoever writes first. */
export function subjectKey(of: Subject): string {
  return of.kind === 'residue' ? `residue:${of.proteinId}:${of.residueIndex}` : `${of.kind}:${of.id}`;
}

export const messageText = z
  .string()
  .trim()
  .min(1, 'Write something.')
  .max(10000, 'At most 10,000 characters.');

/** Its order in the thread is its event number. */
export const message = z.object({
  id,
  threadId: id,
  eventNumber,
  text: z.string(),
  by: personBrief,
  at: moment,
  /** The client's own id, by which it knows its message again. */
  clientKey: id,
});
export type Message = z.infer<typeof message>;

export const thread = z.object({
  id,
  subject,
  subjectKey: z.string(),
  /** How the subject is called on screens. */
  caption: z.string(),
  residue: residueLabel.nullable(),
  messageCount: z.int(),
  lastMessage: message.nullable(),
});
export type Thread = z.infer<typeof thread>;

export const newMessageBody = z.strictObject({ clientKey: id, subject, text: messageText });

export const threads = {
  list: endpoint({
    name: 'threads.list',
    method: 'GET',
    path: '/projects/:projectId/threads',
    params: projectParams,
    query: z.strictObject({
      before: z.coerce.number().int().optional(),
      limit: z.coerce.number().int().min(1).max(100).default(50),
    }),
    reply: z.object({ threads: z.array(thread), next: eventNumber.nullable() }),
  }),
  /** The main thread of a subject with its newest messages; `thread` is null before the first message. */
  ofSubject: endpoint({
    name: 'threads.ofSubject',
    method: 'GET',
    path: '/projects/:projectId/threads/of/:subjectKey',
    params: z.strictObject({ projectId: id, subjectKey: z.string().max(120) }),
    query: z.strictObject({
      before: z.coerce.number().int().optional(),
      limit: z.coerce.number().int().min(1).max(200).default(100),
    }),
    reply: z.object({
      thread: thread.nullable(),
      caption: z.string(),
      residue: residueLabel.nullable(),
      messages: z.array(message),
      earlier: eventNumber.nullable(),
    }),
  }),
  post: endpoint({
    name: 'threads.post',
    method: 'POST',
    path: '/projects/:projectId/messages',
    params: projectParams,
    body: newMessageBody,
    reply: z.object({ message, thread }),
  }),
};

export const threadEvents = { 'message.posted': z.object({ message, thread }) };
