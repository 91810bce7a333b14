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
export { NewPin, type PartnerField } from './components/new-pin';
export { PinsSection } from './components/pins-section';
