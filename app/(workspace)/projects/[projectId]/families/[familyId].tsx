export { FamilyScreen as default } from '@/features/families';
