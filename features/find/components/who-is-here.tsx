import { Person, Row, Text, Time } from '@/components/ui';
import { usePerson } from '@/client/session';
import { usePresence } from '@/client/use-live';

const mostShown = 4;

/** The others in this project as initials, and the count in words. While the line is down: who was here, and when. */
export function WhoIsHere({ projectId }: { projectId: string }) {
  const { people, live, asOf } = usePresence(projectId);
  const own = usePerson()?.id;
  const others = people.filter(({ id }) => id !== own).slice(0, mostShown);
  if (people.length === 0) return null;
  return (
    <Row gap={8}>
      <Text kind="small" tone="soft">
        {live ? (
          `${people.length} here`
        ) : (
          <>
            {people.length} here at <Time iso={new Date(asOf).toISOString()} form="clock" />
          </>
        )}
      </Text>
      {others.map(({ id, name }) => (
        <Person key={id} name={name} presence={live ? 'here' : 'was'} />
      ))}
    </Row>
  );
}
