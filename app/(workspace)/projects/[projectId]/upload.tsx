export { NewUploadScreen as default } from '@/features/uploads/screens/new-upload-screen';
