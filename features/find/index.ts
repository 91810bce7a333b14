export { ProjectFrame } from './project-frame';
export { FindScreen } from './screens/find-screen';
export { FamilyScreen } from './screens/family-screen';
