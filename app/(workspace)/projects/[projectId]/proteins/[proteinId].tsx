export { ProteinScreen as default } from '@/features/families/screens/protein-screen';
