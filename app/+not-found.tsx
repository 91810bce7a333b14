import { EntryFrame } from '@/components/layout';
import { Empty, Link } from '@/components/ui';
import { projectsPath } from '@/client/paths';

export default function NotFound() {
  return (
    <EntryFrame>
      <Empty title="Nothing is at this address" action={<Link href={projectsPath()}>My projects</Link>}>
        The address may be mistyped, or what was here belongs to a project you are not a member of.
      </Empty>
    </EntryFrame>
  );
}
