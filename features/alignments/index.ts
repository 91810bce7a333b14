export { useAlignments } from './use-alignments';
