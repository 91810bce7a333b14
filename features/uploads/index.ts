export { applyToUpload, applyToUploads, withHint } from './apply-upload-event';
export { useExcerpt, useMakeUpload, useUpload, useUploads, type MakeUpload } from './use-uploads';
