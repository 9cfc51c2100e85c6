/** A time as people at work say it: 09:31 today, else day and time. */
import type { Language } from '../../../shared/api/common';

const locales: Record<Language, string> = { en: 'en-GB', es: 'es-ES' };

export function clockWords(at: string, language: Language, now: Date): string {
  const moment = new Date(at);
  const locale = locales[language];
  const time = moment.toLocaleTimeString(locale, { hour: '2-digit', minute: '2-digit' });
  if (moment.toDateString() === now.toDateString()) return time;
  return `${moment.toLocaleDateString(locale, { day: 'numeric', month: 'short' })} ${time}`;
}
