import { createContext, useContext, type ReactNode } from 'react';

/** The places of the frame that the screen within it fills. */
export interface ShellSlots {
  /** The top bar's middle, on a phone. */
  title: HTMLElement | null;
  /** The strip under the top bar, on a phone. */
  strip: HTMLElement | null;
  /** The bar above the bottom bar, on a phone. */
  actions: HTMLElement | null;
  /** The title block at the foot, on a wide screen. */
  block: HTMLElement | null;
}

export const noSlots: ShellSlots = { title: null, strip: null, actions: null, block: null };
export const ShellSlotsContext = createContext<ShellSlots>(noSlots);
export const useShellSlots = (): ShellSlots => useContext(ShellSlotsContext);

/** What every screen of the frame says at the end of its title block: the line, invented data. */
export const StandingWordsContext = createContext<ReactNode>(null);
export const useStandingWords = (): ReactNode => useContext(StandingWordsContext);
