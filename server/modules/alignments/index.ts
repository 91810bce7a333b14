export { addAlignment } from './alignment.adding';
export { AlignmentQueries } from './alignment.queries';
export { AlignmentRevision } from './alignment-revision.entity';
export { AlignmentRow } from './alignment-row.entity';
export { addAlignmentRoutes } from './alignment.routes';
export { AlignmentSegment } from './alignment-segment.entity';
export { Alignment } from './alignment.entity';
