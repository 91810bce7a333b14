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
export { NewProjectScreen } from './screens/new-project-screen';
export { PeopleScreen } from './screens/people-screen';
export { ProjectsScreen } from './screens/projects-screen';
export { SettingsScreen } from './screens/settings-screen';
