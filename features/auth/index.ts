export { usePerson } from '@/client/session';
export { useSignOut } from './use-auth';
export { SignedInOnly } from './components/signed-in-only';
