export { applyToUpload, applyToUploads, withHint } from './apply-upload-event';
export { FoundWhileReading } from './components/found-while-reading';
export { fileSizeWords } from './file-size';
export { stageOf, type UploadStage } from './upload-stage';
export { useExcerpt, useMakeUpload, useUpload, useUploads, type MakeUpload } from './use-uploads';
