export { NewMutantScreen as default } from '@/features/plans';
