export { FoundWhileReading } from './components/found-while-reading';
export { stageOf } from './upload-stage';
export { useMakeUpload, useUploads } from './use-uploads';
