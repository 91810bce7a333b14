export { ResidueScreen as default } from '@/features/residues';
