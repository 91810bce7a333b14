export { createDataSource } from './data-source';
export { migrate } from './migrate';
export { Unit, type AnnouncedEvent } from './unit';
export { UnitOfWork } from './unit-of-work';
