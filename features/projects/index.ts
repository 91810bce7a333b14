export { useMembers } from './use-members';
export { useLiveProject, useMay, useProject } from './use-projects';
