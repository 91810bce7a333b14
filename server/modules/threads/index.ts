export { Message } from './message.entity';
export { SubjectDirectory, type SubjectResolver } from './subject.directory';
export { Thread } from './thread.entity';
export { ThreadQueries } from './thread.queries';
export { addThreadRoutes } from './thread.routes';
export { ThreadService } from './thread.service';
