import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import { z } from 'zod';
import { familyName, part } from '@/shared/contracts/families';
import { BoundCheckbox, BoundSelect, BoundText, Form } from '@/components/form';
import { partWords } from '@/components/residue';
import { Banner, Button, Sheet } from '@/components/ui';
import { showFieldErrors } from '@/client/field-errors';
import { useMakeFamily } from '@/features/families';

/** Other spellings are written with spaces or commas between. */
const written = z.object({
  name: familyName,
  aliases: z
    .string()
    .transform((text) => text.split(/[\s,]+/).filter(Boolean))
    .pipe(z.array(familyName).max(8, 'At most eight other spellings.')),
  part,
  catalytic: z.boolean(),
});
const partOptions = part.options.map((value) => ({ value, label: partWords[value] }));

interface AddFamilyProps {
  projectId: string;
  open: boolean;
  onClose: () => void;
}

export function AddFamily({ projectId, open, onClose }: AddFamilyProps) {
  const make = useMakeFamily(projectId);
  const form = useForm<z.input<typeof written>, unknown, z.output<typeof written>>({
    resolver: zodResolver(written),
    defaultValues: { name: '', aliases: '', part: 'other', catalytic: false },
  });
  const { control, handleSubmit, setError, reset } = form;
  const close = () => {
    make.reset();
    reset();
    onClose();
  };
  const submit = handleSubmit((body) =>
    make.mutate(body, {
      onSuccess: close,
      onError: (error) => void showFieldErrors(error, ['name', 'aliases', 'part'], setError),
    }),
  );
  return (
    <Sheet open={open} title="Add a family" onClose={close}>
      <Form onSubmit={() => void submit()}>
        {make.error && !make.error.problem.fields ? (
          <Banner kind="danger">{make.error.message}</Banner>
        ) : null}
        <BoundText
          control={control}
          name="name"
          label="Name"
          hint="As it is written before a residue: c, γ, OSCP."
          mono
          required
        />
        <BoundText
          control={control}
          name="aliases"
          label="Other spellings"
          hint="What the locator takes too, with spaces between: gamma"
          mono
        />
        <BoundSelect control={control} name="part" label="Part of the motor" options={partOptions} />
        <BoundCheckbox
          control={control}
          name="catalytic"
          label="Its copies are catalytic"
          hint="They take turns in three states: open, loose, tight."
        />
        <Button kind="primary" submit full busyText={make.isPending ? 'Adding the family' : undefined}>
          Add the family
        </Button>
      </Form>
    </Sheet>
  );
}
