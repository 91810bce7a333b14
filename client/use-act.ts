import { useMutation, type UseMutationResult } from '@tanstack/react-query';
import { useState } from 'react';
import { ActKeys } from './act-keys';
import type { Fact } from './facts';
import { liveProjects } from './live-projects';
import type { ApiProblem } from './problem';

export interface Act<Given, Reply> {
  projectId: string;
  send: (given: Given, idempotencyKey: string) => Promise<Reply>;
  /** What the reply tells, as its events will: it goes the same way into the cache. */
  tells: (reply: Reply, given: Given) => Fact[];
}

export type ActResult<Given, Reply> = UseMutationResult<Reply, ApiProblem, Given>;

/** One writing act of a project. Never sent again by itself; sent again by hand it is still done once. */
export function useAct<Given, Reply>({ projectId, send, tells }: Act<Given, Reply>): ActResult<Given, Reply> {
  const [keys] = useState(() => new ActKeys());
  return useMutation<Reply, ApiProblem, Given>({
    mutationFn: (given) => send(given, keys.keyFor(given)),
    onSuccess: (reply, given) => {
      keys.answered();
      liveProjects.tell(projectId, tells(reply, given));
    },
    onError: (error) => keys.answered(error),
  });
}
