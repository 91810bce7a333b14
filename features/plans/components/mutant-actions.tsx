import { Button } from '@/components/ui';
import { useMay } from '@/features/projects';
import type { Design } from '@/shared/contracts/plans';
import { ExportButton, ExportWithCaution } from './export-primers';

interface MutantActionsProps {
  projectId: string;
  /** The one shown. */
  design: Design | undefined;
  isChoosing: boolean;
  onChoose: (design: Design) => void;
  /** No room for the caution beside it. */
  isBar?: boolean;
}

/** The next step with a design: choose it, then take the primers along. */
export function MutantActions({ projectId, design, isChoosing, onChoose, isBar }: MutantActionsProps) {
  const may = useMay(projectId);
  if (!design) return null;
  const canChoose = may('plan') && !design.chosen;
  const choose = canChoose ? (
    <Button
      key="choose"
      kind="primary"
      full
      busyText={isChoosing ? 'Choosing' : undefined}
      offReason={design.proved ? undefined : 'Not proved, so it cannot be chosen'}
      onPress={() => onChoose(design)}
    >
      {design.withinLimits ? `Choose design ${design.rank}` : `Choose ${design.rank}, a limit is missed`}
    </Button>
  ) : null;
  const Export = isBar ? ExportWithCaution : ExportButton;
  return [choose, <Export key="export" projectId={projectId} kind={canChoose ? 'plain' : 'primary'} />];
}
