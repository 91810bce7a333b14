export { UploadScreen as default } from '@/features/uploads/screens/upload-screen';
