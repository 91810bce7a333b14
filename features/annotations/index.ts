export {
  applyToAnnotationsAtResidue,
  applyToAnnotationVersions,
  type AnnotationVersion,
} from './apply-annotation-event';
export {
  useAnnotationsAtResidue,
  useAnnotationVersions,
  useEditAnnotation,
  useMakeAnnotation,
  useSetAnnotationStatus,
} from './use-annotations';
