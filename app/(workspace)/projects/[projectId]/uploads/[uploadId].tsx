export { UploadScreen as default } from '@/features/uploads';
