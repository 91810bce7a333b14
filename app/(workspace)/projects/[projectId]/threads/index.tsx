export { ThreadsScreen as default } from '@/features/threads';
