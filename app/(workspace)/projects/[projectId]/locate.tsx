export { LocateScreen as default } from '@/features/residues/screens/locate-screen';
