export { NewProjectScreen as default } from '@/features/projects/screens/new-project-screen';
