import CircleCheck from 'lucide-react-native/icons/circle-check';
import CircleX from 'lucide-react-native/icons/circle-x';
import TriangleAlert from 'lucide-react-native/icons/triangle-alert';
import { Icon, List, ListRow } from '@/components/ui';
import { mutantPath } from '@/client/paths';
import type { Mutant } from '@/shared/contracts/plans';
import { leadingDesign, linesOfDesign, summaryOf, worstOf, type CheckResult } from '../check-words';
import { ChangePlates } from './change-plates';

const looks = {
  passed: { of: CircleCheck, tone: 'good', label: 'all checks passed' },
  look: { of: TriangleAlert, tone: 'warn', label: 'something to look at' },
  failed: { of: CircleX, tone: 'danger', label: 'a limit is missed' },
} as const satisfies Record<CheckResult, object>;

function detailOf(mutant: Mutant, summary: string | null): string {
  const place = mutant.constructName === null ? 'no construct yet' : mutant.constructName;
  return summary === null ? `${place}, no primers yet` : `${place}, ${summary}`;
}

interface MutantListProps {
  projectId: string;
  mutants: readonly Mutant[];
  currentId?: string;
  label?: string;
}

/** Planned mutants: what is changed, how far it is, and what the checks of its primers say. */
export function MutantList({ projectId, mutants, currentId, label = 'Mutants' }: MutantListProps) {
  return (
    <List label={label} rows={mutants} keyOf={({ id }) => id}>
      {(mutant) => {
        const design = leadingDesign(mutant.designs);
        const lines = design ? linesOfDesign(design) : null;
        return (
          <ListRow
            lead={<ChangePlates mutations={mutant.mutations} />}
            title={design?.chosen ? `${mutant.state}, chosen` : mutant.state}
            detail={detailOf(mutant, lines && summaryOf(lines))}
            end={lines ? <Icon {...looks[worstOf(lines)]} /> : undefined}
            href={mutantPath(projectId, mutant.id)}
            selected={mutant.id === currentId}
          />
        );
      }}
    </List>
  );
}
