export { PlanScreen as default } from '@/features/plans';
