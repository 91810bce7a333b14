import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import type { z } from 'zod';
import { addMemberBody } from '@/shared/contracts/projects';
import { BoundChoice, BoundText, Form } from '@/components/form';
import { Banner, Button } from '@/components/ui';
import { showFieldErrors } from '@/client/field-errors';
import { roleConsequence } from '../role-words';
import { roles } from '@/shared/permissions';
import { useAddMember } from '../use-members';

interface AddMemberFormProps {
  projectId: string;
  readersMayComment: boolean;
  onAdded?: () => void;
}

/** Adds somebody who has an account, by e-mail address, in a role. */
export function AddMemberForm({ projectId, readersMayComment, onAdded }: AddMemberFormProps) {
  const add = useAddMember(projectId);
  const { control, handleSubmit, setError, reset } = useForm<z.input<typeof addMemberBody>>({
    resolver: zodResolver(addMemberBody),
    defaultValues: { email: '', role: 'contributor' },
  });
  const submit = handleSubmit((body) =>
    add.mutate(body, {
      onSuccess: () => {
        reset();
        onAdded?.();
      },
      onError: (error) => void showFieldErrors(error, ['email'], setError),
    }),
  );
  const options = roles.map((role) => ({
    value: role,
    title: role,
    consequence: roleConsequence(role, readersMayComment),
  }));
  return (
    <Form onSubmit={() => void submit()}>
      {add.error ? <Banner kind="danger">{add.error.message}</Banner> : null}
      {add.data && !add.error ? (
        <Banner kind="good">{`${add.data.name} is a member now, as ${add.data.role}.`}</Banner>
      ) : null}
      <BoundText
        control={control}
        name="email"
        label="E-mail"
        hint="Of somebody who has an account here."
        type="email"
        autoComplete="off"
        required
      />
      <BoundChoice control={control} name="role" label="Role" options={options} />
      <Button kind="primary" submit full busyText={add.isPending ? 'Adding' : undefined}>
        Add to the project
      </Button>
    </Form>
  );
}
