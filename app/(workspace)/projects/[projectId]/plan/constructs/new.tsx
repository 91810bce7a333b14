export { NewConstructScreen as default } from '@/features/plans';
