import { z } from 'zod';
import { projectParams } from '@/shared/contracts/common';
import { PageTitle, Panes, Screen } from '@/components/layout';
import { useLayout } from '@/components/theme';
import { NothingHere, Stack } from '@/components/ui';
import { findPath } from '@/client/paths';
import { useRouteParams } from '@/client/use-route-params';
import { LocatorInput } from '../components/locator-input';
import { ReadingList } from '../components/reading-list';
import { ReadingPreview } from '../components/reading-preview';
import { useLocator } from '../use-locator';
import { useOpenReading } from '../use-open-reading';

const locateParams = projectParams.extend({ text: z.string().max(200).optional() });

/** The locator as a whole page: what a link to an address opens, and the phone's way to find a residue. */
export function LocateScreen() {
  const params = useRouteParams(locateParams);
  if (params) return <Locate key={params.text ?? ''} {...params} />;
  return (
    <Screen title="Find a residue">
      <NothingHere />
    </Screen>
  );
}

function Locate({ projectId, text }: { projectId: string; text?: string }) {
  const { hasRail } = useLayout();
  // A link with one reading goes straight there, and back leads to where the link stood.
  const onOpen = useOpenReading(projectId, text ? 'replace' : 'push');
  const locator = useLocator({
    projectId,
    onOpen,
    initialText: text ?? '',
    stays: true,
    opensOnly: text !== undefined,
  });
  const list = (
    <Stack>
      <PageTitle quietOnPhone>Find a residue</PageTitle>
      <LocatorInput locator={locator} large autoFocus />
      <ReadingList locator={locator} />
    </Stack>
  );
  if (!hasRail)
    return (
      <Screen title="Find a residue" backHref={findPath(projectId)}>
        {list}
      </Screen>
    );
  return (
    <Screen kind="panes" title="Find a residue">
      <Panes
        name="locate"
        panes={[
          { key: 'readings', label: 'Readings', content: list },
          {
            key: 'passport',
            label: 'Passport of the highlighted reading',
            widthPixels: 440,
            content: <ReadingPreview projectId={projectId} reading={locator.highlighted} />,
          },
        ]}
      />
    </Screen>
  );
}
