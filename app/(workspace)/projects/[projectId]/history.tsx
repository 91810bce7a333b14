export { HistoryScreen as default } from '@/features/audit/screens/history-screen';
