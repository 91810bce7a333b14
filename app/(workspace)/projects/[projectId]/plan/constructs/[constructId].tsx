export { ConstructScreen as default } from '@/features/plans/screens/construct-screen';
