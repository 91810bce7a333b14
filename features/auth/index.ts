export { usePerson, useSession } from '@/client/session';
export { useSignIn, useSignOut, useSignUp } from './use-auth';
export { SignedInOnly } from './components/signed-in-only';
