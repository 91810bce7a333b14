export { ProjectFrame as default } from '@/features/find';
