export { ConstructScreen as default } from '@/features/plans';
