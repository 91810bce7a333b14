export { NewConstructScreen as default } from '@/features/plans/screens/new-construct-screen';
