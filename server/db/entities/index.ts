export { AuditEntry } from './audit-entry.entity';
export { ClientRequest } from './client-request.entity';
export { Job } from './job.entity';
export { ProjectEventRow } from './project-event.entity';
export { StoredFile } from './stored-file.entity';
export { StreamHead } from './stream-head.entity';
