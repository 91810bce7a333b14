import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import type { z } from 'zod';
import { signInBody } from '@/shared/contracts/auth';
import { BoundText } from '@/components/form';
import { Button } from '@/components/ui';
import { showFieldErrors } from '@/client/field-errors';
import { signUpPath } from '@/client/paths';
import { useSession } from '@/client/session';
import { AccountForm } from '../components/account-form';
import { useSignIn } from '../use-auth';
import { useWayBack } from '../use-way-back';

export function SignInScreen() {
  const { back, leave } = useWayBack();
  const signIn = useSignIn();
  const session = useSession();
  const hasRunOut = session.status === 'signed out' && session.expired;
  const { control, handleSubmit, setError } = useForm<z.input<typeof signInBody>>({
    resolver: zodResolver(signInBody),
    defaultValues: { email: '', password: '' },
  });
  if (leave) return leave;
  const submit = handleSubmit((values) =>
    signIn.mutate(values, {
      onError: (error) => void showFieldErrors(error, ['email', 'password'], setError),
    }),
  );
  return (
    <AccountForm
      title="Sign in"
      introduces={!hasRunOut}
      note={
        hasRunOut
          ? 'Your sign-in ran out. What you wrote is kept here; sign in to go on where you were.'
          : undefined
      }
      onSubmit={() => void submit()}
      problem={signIn.error}
      other={{ question: 'New here?', label: 'Make an account', href: signUpPath(back) }}
    >
      <BoundText
        control={control}
        name="email"
        label="E-mail"
        type="email"
        autoComplete="username"
        required
      />
      <BoundText
        control={control}
        name="password"
        label="Password"
        type="password"
        autoComplete="current-password"
        required
      />
      <Button kind="primary" submit full busyText={signIn.isPending ? 'Signing in' : undefined}>
        Sign in
      </Button>
    </AccountForm>
  );
}
