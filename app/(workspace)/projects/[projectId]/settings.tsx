export { SettingsScreen as default } from '@/features/projects/screens/settings-screen';
