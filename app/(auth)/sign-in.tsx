export { SignInScreen as default } from '@/features/auth/screens/sign-in-screen';
