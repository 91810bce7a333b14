export { AlignmentScreen as default } from '@/features/alignments';
