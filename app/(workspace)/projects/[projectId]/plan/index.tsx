export { PlanScreen as default } from '@/features/plans/screens/plan-screen';
