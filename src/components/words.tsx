/** The language of the screens: a provider, and `useWords` to say things in it. */
import { createContext, useContext, useEffect, useMemo, useState, type ReactNode } from 'react';
import type { Language } from '../../shared/api/common';
import type { Text } from '../../shared/panel/says';
import { render, type WordingKey } from '../../shared/wording/render';

interface Words {
  language: Language;
  setLanguage: (language: Language) => void;
  /** A sentence of the app by its key. */
  t: (key: WordingKey, params?: Text['params']) => string;
  /** A text an engine said; `carried` are the messages its pack brought along. */
  say: (text: Text, carried?: Record<string, string>) => string;
}

const WordsContext = createContext<Words | null>(null);
const storageKey = 'coldloop.language';

function startLanguage(): Language {
  const kept = localStorage.getItem(storageKey);
  if (kept === 'en' || kept === 'es') return kept;
  return navigator.language.startsWith('es') ? 'es' : 'en';
}

export function WordsProvider({ children }: { children: ReactNode }) {
  const [language, setLanguage] = useState<Language>(startLanguage);
  useEffect(() => {
    document.documentElement.lang = language;
    localStorage.setItem(storageKey, language);
  }, [language]);
  const words = useMemo<Words>(
    () => ({
      language,
      setLanguage,
      t: (key, params) => render(language, params ? { key, params } : { key }),
      say: (text, carried) => render(language, text, carried),
    }),
    [language],
  );
  return <WordsContext.Provider value={words}>{children}</WordsContext.Provider>;
}

export function useWords(): Words {
  const words = useContext(WordsContext);
  if (!words) throw new Error('useWords outside WordsProvider');
  return words;
}
