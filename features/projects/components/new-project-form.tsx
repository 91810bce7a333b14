import { zodResolver } from '@hookform/resolvers/zod';
import { useForm } from 'react-hook-form';
import type { OwnProject } from '@/shared/contracts/projects';
import type { Team } from '@/shared/contracts/teams';
import { motorKind } from '@/shared/contracts/projects';
import { BoundChoice, BoundSelect, BoundText, Form } from '@/components/form';
import { Banner, Button, Text } from '@/components/ui';
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
    <Form onSubmit={() => void submit()}>
      {problem ? <Banner kind="danger">{problem.message}</Banner> : null}
      {teams.length > 0 ? <BoundSelect control={control} name="team" label="Team" options={options} /> : null}
      {watch('team') === newTeam ? (
        <BoundText
          control={control}
          name="teamName"
          label="Name of the team"
          hint="The people you work with; you lead it."
          required
        />
      ) : null}
      <BoundText
        control={control}
        name="name"
        label="Name of the project"
        hint="One line of work, with members of its own."
        required
      />
      <Text kind="small" strong>
        Kind of motor
      </Text>
      <BoundChoice control={control} name="motorKind" label="Kind of motor" options={motors} />
      <Text tone="soft">Families can be added later. You are the first lead of the project.</Text>
      <Button kind="primary" submit full busyText={isMaking ? 'Making the project' : undefined}>
        Make the project
      </Button>
    </Form>
  );
}
