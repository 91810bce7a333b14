import { SignedInOnly } from '@/features/auth';

export default SignedInOnly;
