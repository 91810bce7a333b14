export { NewUploadScreen as default } from '@/features/uploads';
