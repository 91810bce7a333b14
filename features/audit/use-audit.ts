import { useInfiniteQuery } from '@tanstack/react-query';
import { useMemo } from 'react';
import { audit } from '@/shared/contracts/audit';
import { call } from '@/client/api';
import { livePages } from '@/client/live-pages';
import { applyToAuditPages, type AuditPage } from './apply-audit-event';

export interface AuditFilter {
  subjectKind?: string;
  subjectId?: string;
}

export const auditQuery = (projectId: string, filter: AuditFilter = {}) =>
  livePages<AuditPage, number>({
    projectId,
    queryKey: ['project', projectId, 'audit', filter],
    read: (before, signal) =>
      call(audit.list, { params: { projectId }, query: { ...filter, before }, signal }),
    next: (page) => page.next,
    apply: applyToAuditPages,
  });

/** Who did what, newest first, of the project or of one thing in it. */
export function useAudit(projectId: string, filter: AuditFilter = {}) {
  const query = useInfiniteQuery(auditQuery(projectId, filter));
  const data = useMemo(() => query.data?.pages.flatMap((page) => page.entries), [query.data]);
  return { ...query, data };
}
