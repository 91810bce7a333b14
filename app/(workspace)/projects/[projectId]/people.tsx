export { PeopleScreen as default } from '@/features/projects';
