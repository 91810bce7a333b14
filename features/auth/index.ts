export { usePerson, useSession } from '@/client/session';
export { useSignIn, useSignOut, useSignUp } from './use-auth';
export { SignInScreen } from './screens/sign-in-screen';
export { SignUpScreen } from './screens/sign-up-screen';
export { SignedInOnly } from './components/signed-in-only';
