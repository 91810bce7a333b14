import { useState } from 'react';
import { z } from 'zod';
import { newProjectBody, type OwnProject } from '@/shared/contracts/projects';
import { newTeamBody } from '@/shared/contracts/teams';
import { useMakeTeam } from '@/features/teams';
import { useMakeProject } from './use-projects';

/** Stands in the list of teams for one that is made with the project. */
export const newTeam = 'new';

const shape = z.object({
  team: z.string().min(1, 'Choose a team.'),
  teamName: z.string(),
  name: newProjectBody.shape.name,
  motorKind: newProjectBody.shape.motorKind,
});
export type NewProject = z.infer<typeof shape>;

/** A name is asked for only where the team is a new one. */
export const newProjectForm = shape.superRefine(({ team, teamName }, context) => {
  if (team !== newTeam) return;
  const named = newTeamBody.shape.name.safeParse(teamName);
  if (!named.success)
    context.addIssue({
      code: 'custom',
      path: ['teamName'],
      message: named.error.issues[0]?.message ?? 'Write a name.',
    });
});

/** Makes the team first where it is a new one; tried again, the same team is taken and not a second one made. */
export function useNewProject(onMade: (project: OwnProject) => void) {
  const makeTeam = useMakeTeam();
  const makeProject = useMakeProject();
  const [madeTeam, setMadeTeam] = useState<{ id: string; name: string } | null>(null);
  const teamIdFor = async ({ team, teamName }: NewProject): Promise<string> => {
    if (team !== newTeam) return team;
    if (madeTeam?.name === teamName.trim()) return madeTeam.id;
    const made = await makeTeam.mutateAsync({ name: teamName });
    setMadeTeam(made);
    return made.id;
  };
  const make = async (values: NewProject) => {
    const teamId = await teamIdFor(values);
    const { name, motorKind } = values;
    onMade(await makeProject.mutateAsync({ teamId, name, motorKind }));
  };
  return {
    make,
    isMaking: makeTeam.isPending || makeProject.isPending,
    problem: makeTeam.error ?? makeProject.error,
  };
}
