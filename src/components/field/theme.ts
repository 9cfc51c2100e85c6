/** Day, night or as the phone says: kept on this device and set on the root element. */
import { useSyncExternalStore } from 'react';

export const themes = ['auto', 'day', 'night'] as const;
export type Theme = (typeof themes)[number];
const key = 'coldloop.theme';
const listeners = new Set<() => void>();

const isTheme = (value: string | null): value is Theme => themes.some((theme) => theme === value);
const read = (): Theme => {
  const kept = localStorage.getItem(key);
  return isTheme(kept) ? kept : 'auto';
};

/** Puts the kept choice on the root element; called once at start and after each change. */
export function applyTheme(): void {
  const theme = read();
  if (theme === 'auto') delete document.documentElement.dataset.theme;
  else document.documentElement.dataset.theme = theme;
}

export function setTheme(theme: Theme): void {
  localStorage.setItem(key, theme);
  applyTheme();
  listeners.forEach((listener) => {
    listener();
  });
}

export function useTheme(): Theme {
  return useSyncExternalStore((listener) => {
    listeners.add(listener);
    return () => listeners.delete(listener);
  }, read);
}
