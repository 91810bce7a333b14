export { createDataSource } from './data-source';
export { isConnectionLost, isDuplicate } from './transient-errors';
export { requestContext, withRequestContext } from './request-context';
export { Unit, type AnnouncedEvent } from './unit';
export { UnitOfWork } from './unit-of-work';
