import type { z } from 'zod';
import type { audit } from '@/shared/contracts/audit';
import { outOfDate } from '@/client/facts';

export type AuditPage = z.infer<typeof audit.list.reply>;

/** Everything that is announced is also in the record, which only the server writes: it is read again. */
export function applyToAuditPages(_pages: AuditPage[]): typeof outOfDate {
  return outOfDate;
}
