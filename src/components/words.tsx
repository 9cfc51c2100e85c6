/** The language of the screens: a provider, and `useWords` to say things in it. */
import { createContext, useContext, useEffect, useMemo, useState, type ReactNode } from 'react';
import type { Language } from '../../shared/api/common';
import type { Text } from '../../shared/panel/says';
import type { WordingKey } from '../../shared/wording/render';
import { chosenLanguage, keepLanguage } from './wording/chosenLanguage';
import { holdLanguage, renderHeld } from './wording/held';

interface Words {
  language: Language;
  setLanguage: (language: Language) => void;
  /** A sentence of the app by its key. */
  t: (key: WordingKey, params?: Text['params']) => string;
  /** A text an engine said; `carried` are the messages its pack brought along. */
  say: (text: Text, carried?: Record<string, string>) => string;
}

const WordsContext = createContext<Words | null>(null);

/** Shows nothing until the messages are there; a language is changed to only when its messages are. */
export function WordsProvider({ children }: { children: ReactNode }) {
  const [wanted, setLanguage] = useState(chosenLanguage);
  const [language, setShown] = useState<Language>();
  useEffect(() => {
    let isOver = false;
    holdLanguage(wanted).then(
      () => {
        if (isOver) return;
        document.documentElement.lang = wanted;
        keepLanguage(wanted);
        setShown(wanted);
      },
      (fault: unknown) => {
        setShown(() => {
          throw fault;
        });
      },
    );
    return () => {
      isOver = true;
    };
  }, [wanted]);
  const words = useMemo<Words | null>(
    () =>
      language
        ? {
            language,
            setLanguage,
            t: (key, params) => renderHeld(language, params ? { key, params } : { key }),
            say: (text, carried) => renderHeld(language, text, carried),
          }
        : null,
    [language],
  );
  return words && <WordsContext.Provider value={words}>{children}</WordsContext.Provider>;
}

export function useWords(): Words {
  const words = useContext(WordsContext);
  if (!words) throw new Error('useWords outside WordsProvider');
  return words;
}
