export { applyToAlignment, applyToAlignments, type AlignmentWithRows } from './apply-alignment-event';
export { useAlignment, useAlignments } from './use-alignments';
