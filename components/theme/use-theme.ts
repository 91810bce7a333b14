import { useCallback, useSyncExternalStore } from 'react';

export type ThemeName = 'light' | 'dark';
export const themeStorageKey = 'locant.theme';

const listeners = new Set<() => void>();
const isTheme = (value: unknown): value is ThemeName => value === 'light' || value === 'dark';

/** What was chosen before wins; without a choice the system's preference does. */
export function chooseTheme(stored: unknown, systemPrefersDark: boolean): ThemeName {
  if (isTheme(stored)) return stored;
  return systemPrefersDark ? 'dark' : 'light';
}

function readStored(): unknown {
  // Storage may be switched off (private windows): the theme then lives as long as the page.
  try {
    return globalThis.localStorage?.getItem(themeStorageKey);
  } catch {
    return undefined;
  }
}

function currentTheme(): ThemeName {
  const shown = globalThis.document?.documentElement.dataset.theme;
  if (isTheme(shown)) return shown;
  const query = globalThis.matchMedia?.('(prefers-color-scheme: dark)');
  return chooseTheme(readStored(), query?.matches ?? false);
}

export function applyTheme(theme: ThemeName): void {
  const root = globalThis.document?.documentElement;
  if (root) root.dataset.theme = theme;
  try {
    globalThis.localStorage?.setItem(themeStorageKey, theme);
  } catch {
    // Nothing to keep it in: it still holds for this page.
  }
  listeners.forEach((listener) => listener());
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}

export function useTheme(): {
  theme: ThemeName;
  setTheme: (theme: ThemeName) => void;
  toggleTheme: () => void;
} {
  const theme = useSyncExternalStore(subscribe, currentTheme, () => 'light' as const);
  const toggleTheme = useCallback(() => applyTheme(currentTheme() === 'dark' ? 'light' : 'dark'), []);
  return { theme, setTheme: applyTheme, toggleTheme };
}
