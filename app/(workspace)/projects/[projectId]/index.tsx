export { FindScreen as default } from '@/features/projects';
