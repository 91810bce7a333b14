import { useRef } from 'react';
import { z } from 'zod';
import { projectParams } from '@/shared/contracts/common';
import { Screen } from '@/components/layout';
import { NothingHere } from '@/components/ui';
import { useRouteParams } from '@/client/use-route-params';
import { LocateFrame } from '../components/locate-frame';
import { LocatorInput } from '../components/locator-input';
import { useEarlyEntry, useLateParts } from '../late-parts';

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
  const place = useRef<HTMLDivElement>(null);
  const parts = useLateParts(place);
  const early = useEarlyEntry(text);
  return (
    <div ref={place} style={{ display: 'contents' }}>
      {parts ? (
        <parts.LocatePage projectId={projectId} linked={text} early={early} />
      ) : (
        <LocateFrame projectId={projectId} list={<LocatorInput locator={early} large autoFocus />} />
      )}
    </div>
  );
}
