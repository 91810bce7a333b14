export { FindScreen as default } from '@/features/find/screens/find-screen';
