export { cappedIssues } from './capped-issues';
export { Upload } from './upload.entity';
export { receiveUpload } from './upload.form';
export { UploadQueries } from './upload.queries';
export { addUploadRoutes } from './upload.routes';
export { uploadJobKinds } from './upload-jobs';
export { UploadService } from './upload.service';
export { UploadStates } from './upload.states';
