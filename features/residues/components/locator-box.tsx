import { useEffect, useRef, useState, type CSSProperties } from 'react';
import { color, layer, lift, useLayout } from '@/components/theme';
import type { EarlyEntry } from '../late-parts';
import { useLocator, type Locator } from '../use-locator';
import { useOpenReading } from '../use-open-reading';
import { KeyHints } from './key-hints';
import { LocatorInput } from './locator-input';
import { ReadingList } from './reading-list';
import { ReadingPreview } from './reading-preview';

const widest = 1000;
const listWidth = 600;

interface LocatorBoxProps {
  projectId: string;
  /** What was typed before this box was here. */
  early: EarlyEntry;
}

/** The box that finds residues, with its panel under it. */
export function LocatorBox({ projectId, early }: LocatorBoxProps) {
  const onOpen = useOpenReading(projectId);
  const locator = useLocator({
    projectId,
    onOpen,
    initialText: early.text,
    startsOpen: early.text !== '',
    opensOnly: early.asks,
  });
  const frame = useRef<HTMLDivElement>(null);
  return (
    <div ref={frame} style={{ position: 'relative', minWidth: 0 }}>
      <LocatorInput locator={locator} />
      <Panel projectId={projectId} locator={locator} frame={frame} />
    </div>
  );
}

interface PanelProps {
  projectId: string;
  locator: Locator;
  frame: React.RefObject<HTMLDivElement | null>;
}

function Panel({ projectId, locator, frame }: PanelProps) {
  const { hasRail } = useLayout();
  const isOpen = locator.box.isOpen && locator.text.trim() !== '';
  const roomPixels = useRoom(frame, isOpen);
  const isWide = hasRail && roomPixels >= 760;
  const floating: CSSProperties = {
    position: 'absolute',
    top: 'calc(100% + 8px)',
    left: 0,
    width: Math.min(widest, roomPixels),
    maxHeight: 'calc(100dvh - 130px)',
    zIndex: layer.popover,
    boxShadow: lift.float,
    borderRadius: 6,
    background: color.raised,
    overflow: 'hidden',
  };
  return (
    // A press in the panel leaves the caret in the box, so that the list stays open.
    <div
      style={{ ...(hasRail ? floating : { paddingTop: 12 }), display: isOpen ? 'flex' : 'none' }}
      onMouseDown={(event) => event.preventDefault()}
    >
      <div
        style={{
          flex: isWide ? `0 1 ${listWidth}px` : 1,
          minWidth: 0,
          padding: hasRail ? '18px 12px' : 0,
          overflowY: hasRail ? 'auto' : undefined,
        }}
      >
        <ReadingList locator={locator} />
        <KeyHints />
      </div>
      {isWide && isOpen ? (
        <div
          style={{
            flex: 1,
            minWidth: 0,
            padding: 18,
            borderLeft: `1px solid ${color.lineHair}`,
            overflowY: 'auto',
          }}
        >
          <ReadingPreview projectId={projectId} reading={locator.highlighted} />
        </div>
      ) : null}
    </div>
  );
}

/** Pixels from the box's left edge to the window's right one. */
function useRoom(frame: PanelProps['frame'], isOpen: boolean): number {
  const { widthPixels } = useLayout();
  const [leftPixels, setLeft] = useState(0);
  useEffect(() => {
    if (isOpen) setLeft(frame.current?.getBoundingClientRect().left ?? 0);
  }, [frame, isOpen, widthPixels]);
  return widthPixels - leftPixels - 20;
}
