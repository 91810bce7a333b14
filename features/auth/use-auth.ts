import type { z } from 'zod';
import type { signInBody, signUpBody } from '@/shared/contracts/auth';
import { signIn, signOut, signUp } from '@/client/session';
import { useOwnAct } from '@/client/use-act';

const nothing = () => {};

export const useSignIn = () => useOwnAct<z.input<typeof signInBody>, void>({ send: signIn, take: nothing });
export const useSignUp = () => useOwnAct<z.input<typeof signUpBody>, void>({ send: signUp, take: nothing });
export const useSignOut = () => useOwnAct<void, void>({ send: signOut, take: nothing });
