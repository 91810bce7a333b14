export { FoundWhileReading } from './components/found-while-reading';
export { errorWords } from './error-words';
export { stageOf } from './upload-stage';
export { useMakeUpload, useUploads } from './use-uploads';
