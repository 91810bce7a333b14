import { useMemo, useState, type KeyboardEvent, type ReactNode } from 'react';
import { useLayout } from '@/components/theme';
import { PhoneFrame } from './phone-frame';
import type { Place } from './place';
import { ShellSlotsContext, StandingWordsContext, type ShellSlots } from './shell-slots';
import { WideFrame } from './wide-frame';

export interface ProjectName {
  name: string;
  detail?: string;
  /** Where its people and settings are. */
  href?: string;
}

export interface AppShellProps {
  places: readonly Place[];
  currentPlace?: string;
  /** Where the sign in the rail leads. */
  homeHref: string;
  project?: ProjectName;
  /** The box to find a residue, in the top bar of a wide screen; it stands in the search landmark. */
  locator?: ReactNode;
  /** Who is here, at the end of the top bar of a wide screen. */
  people?: ReactNode;
  /** Small buttons at the foot of the rail: theme, keys, oneself. */
  railFoot?: ReactNode;
  /** The same on a phone, at the end of the top bar. */
  phoneEnd?: ReactNode;
  /** A sentence about the line, above the page: away, updated. */
  notice?: ReactNode;
  /** At the end of the title block of every screen: the line, invented data. */
  standing?: ReactNode;
  children: ReactNode;
}

export interface FrameProps extends AppShellProps {
  fill: { [Slot in keyof ShellSlots]: (element: HTMLElement | null) => void };
}

/** F6 walks from pane to pane. */
function walkPanes(event: KeyboardEvent<HTMLElement>): void {
  if (event.key !== 'F6') return;
  const panes = Array.from(event.currentTarget.querySelectorAll<HTMLElement>('[data-pane]'));
  if (panes.length === 0) return;
  event.preventDefault();
  const from = panes.findIndex((pane) => pane.contains(document.activeElement));
  const step = event.shiftKey ? -1 : 1;
  const start = from < 0 && event.shiftKey ? 0 : from;
  panes[(start + step + panes.length) % panes.length]?.focus();
}

function skipToMain(): void {
  document.getElementById('main')?.focus();
}

/** The frame around every place of a project. The screen within fills its bars through <Screen>. */
export function AppShell(props: AppShellProps) {
  const { hasRail } = useLayout();
  const [title, setTitle] = useState<HTMLElement | null>(null);
  const [strip, setStrip] = useState<HTMLElement | null>(null);
  const [actions, setActions] = useState<HTMLElement | null>(null);
  const [block, setBlock] = useState<HTMLElement | null>(null);
  const slots = useMemo(() => ({ title, strip, actions, block }), [title, strip, actions, block]);
  const fill = { title: setTitle, strip: setStrip, actions: setActions, block: setBlock };
  const Frame = hasRail ? WideFrame : PhoneFrame;
  return (
    <ShellSlotsContext.Provider value={slots}>
      <StandingWordsContext.Provider value={props.standing}>
        <div
          className="frame"
          onKeyDown={walkPanes}
          style={{
            flex: 1,
            display: 'flex',
            flexDirection: 'column',
            minWidth: 0,
            minHeight: 0,
            height: '100%',
          }}
        >
          <a
            href="#main"
            className="skip-link"
            onClick={(event) => {
              event.preventDefault();
              skipToMain();
            }}
          >
            Skip to the page
          </a>
          <Frame {...props} fill={fill} />
        </div>
      </StandingWordsContext.Provider>
    </ShellSlotsContext.Provider>
  );
}
