export { MutantScreen as default } from '@/features/plans/screens/mutant-screen';
