import { structures } from '@/shared/contracts/structures';
import { PageTitle, Screen } from '@/components/layout';
import { NothingHere, ReadView } from '@/components/ui';
import { findPath } from '@/client/paths';
import { useRouteParams } from '@/client/use-route-params';
import { useFamilies } from '@/features/families';
import { StructurePage } from '../components/structure-page';
import { useStructure } from '../use-structures';

/** A structure: which chain is which protein, and the decisions on it. */
export function StructureScreen() {
  const params = useRouteParams(structures.read.params);
  if (params) return <OneStructure {...params} />;
  return (
    <Screen title="Structure">
      <PageTitle quietOnPhone>Structure</PageTitle>
      <NothingHere />
    </Screen>
  );
}

function OneStructure({ projectId, structureId }: { projectId: string; structureId: string }) {
  const structure = useStructure(projectId, structureId);
  const families = useFamilies(projectId);
  if (structure.data && families.data)
    return <StructurePage projectId={projectId} structure={structure.data} families={families.data} />;
  return (
    <Screen title="Structure" backHref={findPath(projectId)}>
      <PageTitle quietOnPhone>Structure</PageTitle>
      <ReadView of={structure} what="the structure and its chains">
        {() => (
          <ReadView of={families} what="the families">
            {() => null}
          </ReadView>
        )}
      </ReadView>
    </Screen>
  );
}
