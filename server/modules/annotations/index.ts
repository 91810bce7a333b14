export { AnnotationAccess } from './annotation.access';
export { AnnotationVersion } from './annotation-version.entity';
export { Annotation } from './annotation.entity';
export { AnnotationQueries } from './annotation.queries';
export { addAnnotationRoutes } from './annotation.routes';
export { AnnotationService } from './annotation.service';
export { Pin } from './pin.entity';
