export { ThreadScreen as default } from '@/features/threads/screens/thread-screen';
