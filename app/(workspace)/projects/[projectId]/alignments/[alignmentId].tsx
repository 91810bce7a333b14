export { AlignmentScreen as default } from '@/features/alignments/screens/alignment-screen';
