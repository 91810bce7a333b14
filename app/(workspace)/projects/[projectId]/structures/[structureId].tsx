export { StructureScreen as default } from '@/features/structures/screens/structure-screen';
