export { ProjectsScreen as default } from '@/features/projects/screens/projects-screen';
