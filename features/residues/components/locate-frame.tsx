import type { ReactNode } from 'react';
import { PageTitle, Panes, Screen } from '@/components/layout';
import { useLayout } from '@/components/theme';
import { Stack } from '@/components/ui';
import { findPath } from '@/client/paths';

interface LocateFrameProps {
  projectId: string;
  list: ReactNode;
  /** What the highlighted reading is; beside the list where there is room. */
  preview?: ReactNode;
}

/** The page of the locator around its input and list. */
export function LocateFrame({ projectId, list, preview }: LocateFrameProps) {
  const { hasRail } = useLayout();
  const content = (
    <Stack>
      <PageTitle quietOnPhone>Find a residue</PageTitle>
      {list}
    </Stack>
  );
  if (!hasRail)
    return (
      <Screen title="Find a residue" backHref={findPath(projectId)}>
        {content}
      </Screen>
    );
  return (
    <Screen kind="panes" title="Find a residue">
      <Panes
        name="locate"
        panes={[
          { key: 'readings', label: 'Readings', content },
          {
            key: 'passport',
            label: 'Passport of the highlighted reading',
            widthPixels: 440,
            content: preview,
          },
        ]}
      />
    </Screen>
  );
}
