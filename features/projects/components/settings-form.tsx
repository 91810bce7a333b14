import { useEffect, useState } from 'react';
import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import type { z } from 'zod';
import { project as projectSchema, projectSettingsBody, type Project } from '@/shared/contracts/projects';
import { BoundCheckbox, BoundText, Form } from '@/components/form';
import { Banner, BothTexts, Button, Row } from '@/components/ui';
import { showFieldErrors } from '@/client/field-errors';
import { conflictOf } from '@/client/problem';
import { useChangeProject } from '../use-projects';

type Settings = z.input<typeof projectSettingsBody>;
const settingsOf = ({ name, readersMayComment }: Project): Settings => ({ name, readersMayComment });
const commentWords = (may: boolean) => (may ? 'readers may comment' : 'readers only read');

/** The project's settings. They are saved against the version that was shown, never against one that came meanwhile. */
export function SettingsForm({ project }: { project: Project }) {
  const change = useChangeProject(project.id);
  const [base, setBase] = useState(project);
  const form = useForm<Settings>({
    resolver: zodResolver(projectSettingsBody),
    defaultValues: settingsOf(project),
  });
  const { control, handleSubmit, setError, reset, getValues } = form;
  const { isDirty } = form.formState;
  const startFrom = (next: Project) => {
    setBase(next);
    reset(settingsOf(next));
  };
  // A form nobody has touched shows what is true now.
  useEffect(() => {
    if (isDirty || project.version <= base.version) return;
    setBase(project);
    reset(settingsOf(project));
  }, [project, isDirty, base.version, reset]);
  const send = (version: number) => (body: Settings) =>
    change.mutate(
      { version, body },
      {
        onSuccess: startFrom,
        onError: (error) => void showFieldErrors(error, ['name'], setError),
      },
    );
  const theirs = conflictOf(change.error, projectSchema);
  const mine = getValues();
  const busyText = change.isPending ? 'Saving' : undefined;
  return (
    <Form onSubmit={() => void handleSubmit(send(base.version))()}>
      {change.error && !theirs ? <Banner kind="danger">{change.error.message}</Banner> : null}
      {change.isSuccess && !isDirty ? <Banner kind="good">Saved.</Banner> : null}
      <BoundText control={control} name="name" label="Name of the project" required />
      <BoundCheckbox
        control={control}
        name="readersMayComment"
        label="Readers may comment"
        hint="They then write in threads; everything else stays read only for them."
      />
      {theirs ? (
        <BothTexts
          sentence="Somebody changed these settings meanwhile."
          rows={[
            { key: 'name', name: 'Name', theirs: theirs.name, mine: mine.name },
            {
              key: 'comment',
              name: 'Readers',
              theirs: commentWords(theirs.readersMayComment),
              mine: commentWords(mine.readersMayComment),
            },
          ]}
          onTakeTheirs={() => {
            change.reset();
            startFrom(theirs);
          }}
          onKeepMine={() => void handleSubmit(send(theirs.version))()}
          busyText={busyText}
        />
      ) : (
        <Row>
          <Button kind="primary" submit busyText={busyText}>
            Save the settings
          </Button>
        </Row>
      )}
    </Form>
  );
}
