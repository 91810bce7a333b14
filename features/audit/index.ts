export { applyToAuditPages } from './apply-audit-event';
export { useAudit, type AuditFilter } from './use-audit';
