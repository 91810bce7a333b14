import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import type { z } from 'zod';
import { signUpBody } from '@/shared/contracts/auth';
import { BoundText } from '@/components/form';
import { Button } from '@/components/ui';
import { showFieldErrors } from '@/client/field-errors';
import { signInPath } from '@/client/paths';
import { AccountForm } from '../components/account-form';
import { useSignUp } from '../use-auth';
import { useWayBack } from '../use-way-back';

const fields = [
  { name: 'name', label: 'Your name', hint: 'As the others see it.', type: 'text', autoComplete: 'name' },
  { name: 'email', label: 'E-mail', hint: undefined, type: 'email', autoComplete: 'username' },
  {
    name: 'password',
    label: 'Password',
    hint: 'At least 10 characters.',
    type: 'password',
    autoComplete: 'new-password',
  },
] as const;

export function SignUpScreen() {
  const { back, leave } = useWayBack();
  const signUp = useSignUp();
  const { control, handleSubmit, setError } = useForm<z.input<typeof signUpBody>>({
    resolver: zodResolver(signUpBody),
    defaultValues: { email: '', name: '', password: '' },
  });
  if (leave) return leave;
  const submit = handleSubmit((values) =>
    signUp.mutate(values, {
      onError: (error) => void showFieldErrors(error, ['email', 'name', 'password'], setError),
    }),
  );
  return (
    <AccountForm
      title="Make an account"
      onSubmit={() => void submit()}
      problem={signUp.error}
      other={{ question: 'You have an account?', label: 'Sign in', href: signInPath(back) }}
    >
      {fields.map(({ name, ...words }) => (
        <BoundText key={name} control={control} name={name} {...words} required />
      ))}
      <Button kind="primary" submit full busyText={signUp.isPending ? 'Making the account' : undefined}>
        Make the account
      </Button>
    </AccountForm>
  );
}
