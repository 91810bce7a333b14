export { applyToAlignment, applyToAlignments, type AlignmentWithRows } from './apply-alignment-event';
export { AlignmentScreen } from './screens/alignment-screen';
export { useAlignment, useAlignments } from './use-alignments';
