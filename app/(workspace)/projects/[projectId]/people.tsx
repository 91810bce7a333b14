export { PeopleScreen as default } from '@/features/projects/screens/people-screen';
