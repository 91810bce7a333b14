import Eye from 'lucide-react-native/icons/eye';
import TriangleAlert from 'lucide-react-native/icons/triangle-alert';
import { Mark } from '@/components/ui';
import { decidedWord, doubts, type ChainGroup } from '../chain-groups';

/** How a group of chains stands, as an icon with a word. */
export function StandingMark({ group }: { group: ChainGroup }) {
  const { standing, first } = group;
  switch (standing) {
    case 'choose':
      return (
        <Mark tone="danger" icon={TriangleAlert}>
          choose
        </Mark>
      );
    case 'look':
      return (
        <Mark tone="warn" icon={Eye}>
          {`look at ${doubts(first).length}`}
        </Mark>
      );
    case 'ready':
      return <Mark tone="good">ready</Mark>;
    case 'decided':
      return <Mark tone="good">{decidedWord(group)}</Mark>;
    case 'left out':
      return <Mark>left out</Mark>;
    case 'no protein':
      return <Mark>no protein</Mark>;
  }
}
