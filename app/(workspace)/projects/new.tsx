export { NewProjectScreen as default } from '@/features/projects';
