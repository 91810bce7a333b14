export { StructureScreen as default } from '@/features/structures';
