import { Button, Caption, Stack } from '@/components/ui';
import { projectsPath } from '@/client/paths';
import { usePerson } from '@/client/session';
import { OwnPerson } from './own-person';

/** Oneself on a phone, where there is no rail: theme, other projects, the way out. */
export function OwnCorner() {
  if (!usePerson()) return null;
  return (
    <Stack gap={8}>
      <Caption>You</Caption>
      <OwnPerson>
        <Button href={projectsPath()}>My projects</Button>
      </OwnPerson>
    </Stack>
  );
}
