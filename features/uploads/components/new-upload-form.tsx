import { zodResolver } from '@hookform/resolvers/zod';
import { useRouter } from 'expo-router';
import { useState } from 'react';
import { useForm } from 'react-hook-form';
import type { z } from 'zod';
import { newUploadBody, type Upload } from '@/shared/contracts/uploads';
import { BoundSelect, BoundText, FileDrop } from '@/components/form';
import { Banner, Button, ReadView, Stack } from '@/components/ui';
import { showFieldErrors } from '@/client/field-errors';
import { uploadPath } from '@/client/paths';
import { familyOptions, useFamilies } from '@/features/families';
import { uploadLimits, whyNotSent } from '../upload-limits';
import { useMakeUpload } from '../use-uploads';
import { Sending } from './sending';

interface NewUploadFormProps {
  projectId: string;
  kind: Upload['kind'];
  familyId?: string;
}

/** A file and what belongs to it. Choosing the file sends it. */
export function NewUploadForm({ projectId, kind, familyId }: NewUploadFormProps) {
  const router = useRouter();
  const families = useFamilies(projectId);
  const make = useMakeUpload(projectId);
  const [file, setFile] = useState<File | null>(null);
  const [refusal, setRefusal] = useState<string | null>(null);
  const { control, handleSubmit, setError, watch } = useForm<z.input<typeof newUploadBody>>({
    resolver: zodResolver(newUploadBody),
    defaultValues: { kind, familyId },
  });
  const needsFamily = kind === 'alignment' && !watch('familyId');
  const send = (chosen: File) => {
    setFile(chosen);
    setRefusal(whyNotSent(kind, chosen));
    if (whyNotSent(kind, chosen) !== null) return;
    void handleSubmit((fields) =>
      make.mutate(
        { file: chosen, fields },
        {
          onSuccess: ({ id }) => router.replace(uploadPath(projectId, id) as never),
          onError: (error) => void showFieldErrors(error, ['familyId', 'name'], setError),
        },
      ),
    )();
  };
  if (make.isPending && file) return <Sending kind={kind} fileName={file.name} share={make.share} />;
  const limits = uploadLimits[kind];
  const mayComeAgain = make.error?.undecided === true && file !== null && refusal === null;
  return (
    <Stack gap={16}>
      {make.error && refusal === null ? <Banner kind="danger">{make.error.message}</Banner> : null}
      {kind === 'alignment' ? (
        <ReadView of={families} what="the families">
          {(list) => (
            <BoundSelect
              control={control}
              name="familyId"
              label="Family"
              hint="The kind of subunit that all its rows are."
              placeholder="Choose a family"
              options={familyOptions(list)}
              emptyIsNone
              required
            />
          )}
        </ReadView>
      ) : null}
      <BoundText
        control={control}
        name="name"
        label="Name"
        hint="Left empty, it is called as the file."
        emptyIsNone
      />
      <FileDrop
        title={limits.title}
        hint={limits.hint}
        accept={limits.accept}
        offReason={needsFamily ? 'Choose the family first' : undefined}
        onFile={send}
        error={refusal ?? undefined}
        more={
          mayComeAgain ? <Button onPress={() => send(file)}>{`Send ${file.name} again`}</Button> : undefined
        }
      />
    </Stack>
  );
}
