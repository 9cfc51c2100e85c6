import { useEffect, useState } from 'react';

export type Theme = 'day' | 'night';
const storageKey = 'coldloop.theme';

const systemTheme = (): Theme =>
  window.matchMedia('(prefers-color-scheme: dark)').matches ? 'night' : 'day';

function keptTheme(): Theme | null {
  const kept = localStorage.getItem(storageKey);
  return kept === 'day' || kept === 'night' ? kept : null;
}

/** Puts a theme that was chosen by hand on the page; called before the first paint. */
export function applyKeptTheme(): void {
  const kept = keptTheme();
  if (kept) document.documentElement.dataset['theme'] = kept;
}

/** The theme in force: the system's until somebody chooses by hand. */
export function useTheme(): [Theme, (theme: Theme) => void] {
  const [theme, setTheme] = useState<Theme>(() => keptTheme() ?? systemTheme());
  useEffect(() => {
    const query = window.matchMedia('(prefers-color-scheme: dark)');
    const follow = () => setTheme(keptTheme() ?? systemTheme());
    query.addEventListener('change', follow);
    return () => query.removeEventListener('change', follow);
  }, []);
  const choose = (chosen: Theme) => {
    localStorage.setItem(storageKey, chosen);
    document.documentElement.dataset['theme'] = chosen;
    setTheme(chosen);
  };
  return [theme, choose];
}
