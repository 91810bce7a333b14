export { ProjectFrame } from './project-frame';
