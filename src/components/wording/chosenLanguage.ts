/** The language a person chose on this device, or else the one their browser asks for. */
import type { Language } from '../../../shared/api/common';

const key = 'coldloop.language';

export function chosenLanguage(): Language {
  const kept = localStorage.getItem(key);
  if (kept === 'en' || kept === 'es') return kept;
  return navigator.language.startsWith('es') ? 'es' : 'en';
}

export const keepLanguage = (language: Language): void => {
  localStorage.setItem(key, language);
};
