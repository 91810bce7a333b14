import type { EarlyEntry } from '../late-parts';
import { useLocator } from '../use-locator';
import { useOpenReading } from '../use-open-reading';
import { LocateFrame } from './locate-frame';
import { LocatorInput } from './locator-input';
import { ReadingList } from './reading-list';
import { ReadingPreview } from './reading-preview';

interface LocatePageProps {
  projectId: string;
  /** The address that a link asked for. */
  linked?: string;
  /** What was typed before this page was here. */
  early: EarlyEntry;
}

/** The locator with its list as a whole page. */
export function LocatePage({ projectId, linked, early }: LocatePageProps) {
  // A link with one reading goes straight there, and back leads to where the link stood.
  const onOpen = useOpenReading(projectId, linked ? 'replace' : 'push');
  const locator = useLocator({
    projectId,
    onOpen,
    initialText: early.text,
    stays: true,
    opensOnly: early.asks || (linked !== undefined && early.text === linked),
  });
  return (
    <LocateFrame
      projectId={projectId}
      list={
        <>
          <LocatorInput locator={locator} large autoFocus />
          <ReadingList locator={locator} />
        </>
      }
      preview={<ReadingPreview projectId={projectId} reading={locator.highlighted} />}
    />
  );
}
