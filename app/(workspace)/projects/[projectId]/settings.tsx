export { SettingsScreen as default } from '@/features/projects';
