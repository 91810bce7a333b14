export { ThreadScreen as default } from '@/features/threads';
