export { ThreadsScreen as default } from '@/features/threads/screens/threads-screen';
