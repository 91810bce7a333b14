export { applyToMembers, applyToOwnProject, applyToProjects } from './apply-project-event';
export { useAddMember, useChangeMember, useMembers, useRemoveMember } from './use-members';
export {
  useChangeProject,
  useLiveProject,
  useMakeProject,
  useMay,
  useProject,
  useProjects,
} from './use-projects';
export { usePresence } from '@/client/use-live';
