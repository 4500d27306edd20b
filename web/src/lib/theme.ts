import { useSyncExternalStore } from 'react';

export type Theme = 'auto' | 'light' | 'dark';

// public/first-paint.js reads the same key before the page is drawn.
const KEY = 'metewand.theme';
const listeners = new Set<() => void>();

function currentTheme(): Theme {
  const mode = document.documentElement.dataset.colorMode;
  return mode === 'light' || mode === 'dark' ? mode : 'auto';
}

/** Sets the theme of this browser; "auto" follows the system. */
export function chooseTheme(theme: Theme): void {
  document.documentElement.dataset.colorMode = theme;
  try {
    if (theme === 'auto') localStorage.removeItem(KEY);
    else localStorage.setItem(KEY, theme);
  } catch {
    // Storage is closed to us: the choice lasts as long as the page.
  }
  listeners.forEach((listener) => listener());
}

export function useTheme(): Theme {
  return useSyncExternalStore(subscribe, currentTheme);
}

function subscribe(listener: () => void): () => void {
  listeners.add(listener);
  return () => listeners.delete(listener);
}
