import { useQuery } from '@tanstack/react-query';
import type { z } from 'zod';
import { projects, type addMemberBody, type Member } from '@/shared/contracts/projects';
import type { Role } from '@/shared/permissions';
import { call } from '@/client/api';
import { liveQuery } from '@/client/live-query';
import { useAct } from '@/client/use-act';
import { applyToMembers } from './apply-project-event';

export const membersQuery = (projectId: string) =>
  liveQuery<Member[]>({
    projectId,
    queryKey: ['project', projectId, 'projects', 'members'],
    read: (signal) => call(projects.members, { params: { projectId }, signal }),
    apply: applyToMembers,
  });

export function useMembers(projectId: string) {
  return useQuery(membersQuery(projectId));
}

export function useAddMember(projectId: string) {
  return useAct<z.input<typeof addMemberBody>, Member>(projectId, {
    send: (body, idempotencyKey) => call(projects.addMember, { params: { projectId }, body, idempotencyKey }),
    tells: (payload) => [{ kind: 'member.added', payload }],
  });
}

export function useChangeMember(projectId: string) {
  return useAct<{ personId: string; role: Role }, Member>(projectId, {
    send: ({ personId, role }, idempotencyKey) =>
      call(projects.changeMember, { params: { projectId, personId }, body: { role }, idempotencyKey }),
    tells: (payload) => [{ kind: 'member.changed', payload }],
  });
}

export function useRemoveMember(projectId: string) {
  return useAct<{ personId: string }, { personId: string }>(projectId, {
    send: ({ personId }, idempotencyKey) =>
      call(projects.removeMember, { params: { projectId, personId }, idempotencyKey }),
    tells: (payload) => [{ kind: 'member.removed', payload }],
  });
}
