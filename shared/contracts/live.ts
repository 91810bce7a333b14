import { z } from 'zod';
import { alignmentEvents } from './alignments';
import { annotationEvents } from './annotations';
import { eventNumber, id, personBrief } from './common';
import { familyEvents } from './families';
import { mapEvents } from './maps';
import { planEvents } from './plans';
import { projectEvents, type ProjectEvent } from './projects';
import { structureEvents } from './structures';
import { threadEvents } from './threads';
import { uploadEvents, type uploadProgress } from './uploads';

/** Every project event and the shape of its payload. */
export const eventKinds = {
  ...projectEvents,
  ...familyEvents,
  ...uploadEvents,
  ...alignmentEvents,
  ...structureEvents,
  ...mapEvents,
  ...annotationEvents,
  ...threadEvents,
  ...planEvents,
};
export type EventKind = keyof typeof eventKinds;
export type EventPayload<Kind extends EventKind> = z.infer<(typeof eventKinds)[Kind]>;
export type KnownEvent = {
  [Kind in EventKind]: Omit<ProjectEvent, 'kind' | 'payload'> & { kind: Kind; payload: EventPayload<Kind> };
}[EventKind];

export const presence = z.object({ projectId: id, people: z.array(personBrief) });
export const typing = z.object({ projectId: id, subjectKey: z.string(), person: personBrief });

/** What the socket carries to a browser: facts that are stored, and hints that are not. */
export interface ServerToClient {
  'project:event': (event: ProjectEvent) => void;
  'project:head': (head: { projectId: string; head: number }) => void;
  'project:left': (left: { projectId: string }) => void;
  'project:presence': (people: z.infer<typeof presence>) => void;
  'project:typing': (typist: z.infer<typeof typing>) => void;
  'upload:progress': (progress: z.infer<typeof uploadProgress> & { projectId: string }) => void;
}
export interface ClientToServer {
  'project:join': (
    body: { projectId: string },
    reply: (answer: { head: number } | { refused: string }) => void,
  ) => void;
  'project:leave': (body: { projectId: string }) => void;
  'project:typing': (body: { projectId: string; subjectKey: string }) => void;
}
export const joinBody = z.strictObject({ projectId: id });
export const typingBody = z.strictObject({ projectId: id, subjectKey: z.string().max(120) });
export const headBody = z.object({ projectId: id, head: eventNumber });
