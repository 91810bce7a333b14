export { applyToUpload, applyToUploads, withHint } from './apply-upload-event';
export { fileSizeWords } from './file-size';
export { NewUploadScreen } from './screens/new-upload-screen';
export { UploadScreen } from './screens/upload-screen';
export { stageOf, type UploadStage } from './upload-stage';
export { useExcerpt, useMakeUpload, useUpload, useUploads, type MakeUpload } from './use-uploads';
