export { MutantScreen as default } from '@/features/plans';
