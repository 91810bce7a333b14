import { zodResolver } from '@hookform/resolvers/zod';
import { Controller, useForm } from 'react-hook-form';
import type { OwnProject } from '@/shared/contracts/projects';
import type { Team } from '@/shared/contracts/teams';
import { motorKind } from '@/shared/contracts/projects';
import { Select, TextInput } from '@/components/form';
import { Banner, Button, Choice, Stack, Text } from '@/components/ui';
import { showFieldErrors } from '@/client/field-errors';
import { motorWords } from '../motor-words.data';
import { newProjectForm, newTeam, useNewProject, type NewProject } from '../use-new-project';

interface NewProjectFormProps {
  /** The teams one leads. */
  teams: readonly Team[];
  onMade: (project: OwnProject) => void;
}

const motors = motorKind.options.map((value) => ({
  value,
  title: motorWords[value].title,
  consequence: `${motorWords[value].found} Starts with the families ${motorWords[value].families.join(', ')}.`,
}));

export function NewProjectForm({ teams, onMade }: NewProjectFormProps) {
  const { make, isMaking, problem } = useNewProject(onMade);
  const form = useForm<NewProject>({
    resolver: zodResolver(newProjectForm),
    defaultValues: { team: teams[0]?.id ?? newTeam, teamName: '', name: '', motorKind: 'F' },
  });
  const { control, handleSubmit, setError, watch } = form;
  const submit = handleSubmit((values) =>
    make(values).catch((error: unknown) => void showFieldErrors(error, ['name', 'motorKind'], setError)),
  );
  const options = [
    ...teams.map(({ id, name }) => ({ value: id, label: name })),
    { value: newTeam, label: 'A new team' },
  ];
  return (
    <form
      noValidate
      onSubmit={(event) => {
        event.preventDefault();
        void submit();
      }}
    >
      <Stack gap={16}>
        {problem ? <Banner kind="danger">{problem.message}</Banner> : null}
        {teams.length > 0 ? (
          <Controller
            control={control}
            name="team"
            render={({ field, fieldState }) => (
              <Select label="Team" options={options} {...field} error={fieldState.error?.message} />
            )}
          />
        ) : null}
        {watch('team') === newTeam ? (
          <Controller
            control={control}
            name="teamName"
            render={({ field, fieldState }) => (
              <TextInput
                label="Name of the team"
                hint="The people you work with; you lead it."
                required
                {...field}
                error={fieldState.error?.message}
              />
            )}
          />
        ) : null}
        <Controller
          control={control}
          name="name"
          render={({ field, fieldState }) => (
            <TextInput
              label="Name of the project"
              hint="One line of work, with members of its own."
              required
              {...field}
              error={fieldState.error?.message}
            />
          )}
        />
        <Text kind="small" strong>
          Kind of motor
        </Text>
        <Controller
          control={control}
          name="motorKind"
          render={({ field }) => (
            <Choice label="Kind of motor" options={motors} value={field.value} onChange={field.onChange} />
          )}
        />
        <Text tone="soft">Families can be added later. You are the first lead of the project.</Text>
        <Button kind="primary" submit full busyText={isMaking ? 'Making the project' : undefined}>
          Make the project
        </Button>
      </Stack>
    </form>
  );
}
