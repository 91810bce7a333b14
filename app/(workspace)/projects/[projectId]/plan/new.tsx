export { NewMutantScreen as default } from '@/features/plans/screens/new-mutant-screen';
