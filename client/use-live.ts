import { useCallback, useEffect, useState, useSyncExternalStore } from 'react';
import type { PersonBrief } from '@/shared/contracts/common';
import type { Presence } from './live-people';
import { liveProjects } from './live-projects';
import { realtime, type Connection, type UploadHint } from './realtime';

/** Whether the line to the server is up. */
export function useConnection(): Connection {
  return useSyncExternalStore(realtime.onConnection.subscribe, realtime.connection, realtime.connection);
}

/** Follows a project live while mounted. `ready`: its first read is there, so events count on from it. */
export function useProjectLine(projectId: string, ready: boolean): void {
  useEffect(() => (ready ? liveProjects.open(projectId) : undefined), [projectId, ready]);
}

export function usePresence(projectId: string): Presence {
  const read = () => realtime.people.presenceOf(projectId);
  return useSyncExternalStore(realtime.people.subscribe, read, read);
}

/** Who types here, and a function to say that one does oneself. */
export function useTyping(
  projectId: string,
  subjectKey: string,
): { typists: PersonBrief[]; type: () => void } {
  const read = () => realtime.people.typistsOf(projectId, subjectKey);
  const typists = useSyncExternalStore(realtime.people.subscribe, read, read);
  const type = useCallback(() => realtime.type(projectId, subjectKey), [projectId, subjectKey]);
  return { typists, type };
}

/** The latest hints on files being read in a project, by upload. */
export function useUploadHints(projectId: string): ReadonlyMap<string, UploadHint> {
  const [hints, setHints] = useState<ReadonlyMap<string, UploadHint>>(new Map());
  useEffect(
    () =>
      realtime.onUploadHint.subscribe((hint) => {
        if (hint.projectId === projectId) setHints((known) => new Map(known).set(hint.uploadId, hint));
      }),
    [projectId],
  );
  return hints;
}
