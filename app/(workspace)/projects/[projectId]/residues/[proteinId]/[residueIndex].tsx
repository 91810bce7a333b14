export { ResidueScreen as default } from '@/features/residues/screens/residue-screen';
