export { ProteinScreen as default } from '@/features/families';
