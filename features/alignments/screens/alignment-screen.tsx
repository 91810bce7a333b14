import { alignments } from '@/shared/contracts/alignments';
import { PageTitle, Screen } from '@/components/layout';
import { NothingHere, ReadView } from '@/components/ui';
import { findPath } from '@/client/paths';
import { useRouteParams } from '@/client/use-route-params';
import { useFamilies } from '@/features/families';
import { AlignmentPage } from '../components/alignment-page';
import { useAlignment } from '../use-alignments';

/** The rows of one alignment. */
export function AlignmentScreen() {
  const params = useRouteParams(alignments.read.params);
  if (params) return <OneAlignment {...params} />;
  return (
    <Screen title="Alignment">
      <PageTitle quietOnPhone>Alignment</PageTitle>
      <NothingHere />
    </Screen>
  );
}

function OneAlignment({ projectId, alignmentId }: { projectId: string; alignmentId: string }) {
  const alignment = useAlignment(projectId, alignmentId);
  const families = useFamilies(projectId);
  if (alignment.data) {
    const family = families.data?.find(({ id }) => id === alignment.data.familyId);
    return <AlignmentPage projectId={projectId} alignment={alignment.data} family={family} />;
  }
  return (
    <Screen title="Alignment" backHref={findPath(projectId)}>
      <PageTitle quietOnPhone>Alignment</PageTitle>
      <ReadView of={alignment} what="the alignment">
        {() => null}
      </ReadView>
    </Screen>
  );
}
