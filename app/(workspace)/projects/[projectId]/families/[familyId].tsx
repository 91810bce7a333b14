export { FamilyScreen as default } from '@/features/find/screens/family-screen';
