export { SignUpScreen as default } from '@/features/auth';
