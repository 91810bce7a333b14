import type { Member } from '@/shared/contracts/projects';
import { can } from '@/shared/permissions';
import { Banner } from '@/components/ui';

/** For whoever may not upload: who may. */
export function AskCurators({ members }: { members: readonly Member[] }) {
  const names = members.filter(({ role }) => can(role, 'upload')).map(({ name }) => name);
  const last = names.pop() ?? '';
  const who = names.length > 0 ? `${names.join(', ')} and ${last}` : last;
  return (
    <Banner announce={false}>
      {`The next step is an alignment. Uploading is for curators and leads; here that is ${who}.`}
    </Banner>
  );
}
