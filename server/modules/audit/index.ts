export { addAuditRoutes } from './audit.routes';
