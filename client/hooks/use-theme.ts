import { useSyncExternalStore } from 'react';
import type { Theme } from '#shared/schemas/preferences.ts';

/** The script in index.html reads the same key before the first paint. */
const KEY = 'featherbeam.theme';
const listeners = new Set<() => void>();
/** Holds the choice where storage is refused. */
let chosen: Theme | null = null;

function isTheme(value: unknown): value is Theme {
  return value === 'system' || value === 'light' || value === 'dark';
}

/** The choice of this browser. */
export function storedTheme(): Theme {
  try {
    const value = localStorage.getItem(KEY);
    return isTheme(value) ? value : (chosen ?? 'system');
  } catch {
    return chosen ?? 'system';
  }
}

function systemIsDark(): boolean {
  return matchMedia('(prefers-color-scheme: dark)').matches;
}

function apply(theme: Theme): void {
  document.documentElement.classList.toggle(
    'dark',
    theme === 'dark' || (theme === 'system' && systemIsDark()),
  );
}

function subscribe(listener: () => void): () => void {
  const media = matchMedia('(prefers-color-scheme: dark)');
  const onChange = () => {
    apply(storedTheme());
    listener();
  };
  listeners.add(listener);
  media.addEventListener('change', onChange);
  addEventListener('storage', onChange);
  return () => {
    listeners.delete(listener);
    media.removeEventListener('change', onChange);
    removeEventListener('storage', onChange);
  };
}

/** The reader's choice of theme and how to change it. */
export function useTheme(): [Theme, (theme: Theme) => void] {
  const theme = useSyncExternalStore(subscribe, storedTheme);
  return [theme, setTheme];
}

function setTheme(theme: Theme): void {
  chosen = theme;
  try {
    localStorage.setItem(KEY, theme);
  } catch {
    // The choice then holds until the page is left.
  }
  apply(theme);
  for (const listener of listeners) listener();
}
