export { readExcerpt, type Excerpt } from './excerpt';
export { FileStore, type ReceivedFile } from './file-store';
