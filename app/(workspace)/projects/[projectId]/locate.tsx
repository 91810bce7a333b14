export { LocateScreen as default } from '@/features/residues';
