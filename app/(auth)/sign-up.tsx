export { SignUpScreen as default } from '@/features/auth/screens/sign-up-screen';
