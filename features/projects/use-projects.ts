import { useQuery, useQueryClient } from '@tanstack/react-query';
import { useCallback } from 'react';
import type { z } from 'zod';
import {
  projects,
  type newProjectBody,
  type OwnProject,
  type Project,
  type projectSettingsBody,
} from '@/shared/contracts/projects';
import { can, type Act, type Circumstances } from '@/shared/permissions';
import { call } from '@/client/api';
import { byText } from '@/client/keep-newer';
import { liveProjects } from '@/client/live-projects';
import { liveQuery } from '@/client/live-query';
import { usePerson } from '@/client/session';
import { useAct, useOwnAct } from '@/client/use-act';
import { useProjectLine } from '@/client/use-live';
import { applyToOwnProject, applyToProjects } from './apply-project-event';

const listKey = ['projects'];
const projectKey = (projectId: string) => ['project', projectId, 'projects'];

export const projectsQuery = (personId: string) =>
  liveQuery<OwnProject[]>({
    projectId: null,
    queryKey: listKey,
    read: (signal) => call(projects.list, { signal }),
    apply: (list, fact, projectId) => applyToProjects(list, fact, projectId, personId),
  });

export const projectQuery = (projectId: string, personId: string) =>
  liveQuery<OwnProject>({
    projectId,
    queryKey: projectKey(projectId),
    anchors: true,
    async read(signal) {
      const project = await call(projects.read, { params: { projectId }, signal });
      liveProjects.anchor(projectId, project.head);
      return project;
    },
    apply: (project, fact) => applyToOwnProject(project, fact, personId),
  });

export function useProjects() {
  return useQuery(projectsQuery(usePerson()?.id ?? ''));
}

/** A project with one's own role in it. */
export function useProject(projectId: string) {
  return useQuery(projectQuery(projectId, usePerson()?.id ?? ''));
}

/** The project, followed live while mounted: once, around all screens of a project. */
export function useLiveProject(projectId: string) {
  const project = useProject(projectId);
  useProjectLine(projectId, project.data !== undefined);
  return project;
}

/** Asks the table of rights for one's own role here. Nothing is allowed before the project is read. */
export function useMay(projectId: string): (act: Act, circumstances?: Circumstances) => boolean {
  const { data } = useProject(projectId);
  const role = data?.role;
  const readersMayComment = data?.readersMayComment ?? false;
  return useCallback(
    (act, circumstances) => role !== undefined && can(role, act, { readersMayComment, ...circumstances }),
    [role, readersMayComment],
  );
}

export function useMakeProject() {
  const client = useQueryClient();
  return useOwnAct<z.input<typeof newProjectBody>, OwnProject>({
    send: (body, idempotencyKey) => call(projects.make, { body, idempotencyKey }),
    take: (made) =>
      client.setQueryData<OwnProject[]>(
        listKey,
        (list) =>
          list &&
          [...list.filter(({ id }) => id !== made.id), made].sort((one, other) => byText(one.id, other.id)),
      ),
  });
}

export function useChangeProject(projectId: string) {
  type Given = { version: number; body: z.input<typeof projectSettingsBody> };
  return useAct<Given, Project>(projectId, {
    send: ({ version, body }, idempotencyKey) =>
      call(projects.change, { params: { projectId }, version, body, idempotencyKey }),
    tells: (payload) => [{ kind: 'project.changed', payload }],
  });
}
