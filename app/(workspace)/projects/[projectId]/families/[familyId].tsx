export { FamilyScreen as default } from '@/features/find';
