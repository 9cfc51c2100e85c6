import type { Language } from '../../shared/api/common';

export type MomentForm = 'when' | 'date' | 'time' | 'exact';

const locales: Record<Language, string> = { en: 'en-GB', es: 'es-ES' };
const forms: Record<Exclude<MomentForm, 'when'>, Intl.DateTimeFormatOptions> = {
  date: { day: 'numeric', month: 'short', year: 'numeric' },
  time: { hour: '2-digit', minute: '2-digit', second: '2-digit' },
  exact: {
    day: 'numeric',
    month: 'short',
    year: 'numeric',
    hour: '2-digit',
    minute: '2-digit',
    timeZoneName: 'short',
  },
};

/** An instant or a plain date in words; `when` says "today 11:42" on the same day. A plain date is never shifted by a zone. */
export function momentWords(
  at: string,
  form: MomentForm,
  language: Language,
  todayWord: string,
  now: Date,
): string {
  const moment = at.length === 10 ? new Date(`${at}T12:00:00`) : new Date(at);
  const locale = locales[language];
  if (form !== 'when') return new Intl.DateTimeFormat(locale, forms[form]).format(moment);
  const time = new Intl.DateTimeFormat(locale, { hour: '2-digit', minute: '2-digit' }).format(moment);
  if (moment.toDateString() === now.toDateString()) return `${todayWord} ${time}`;
  const day = new Intl.DateTimeFormat(locale, { day: 'numeric', month: 'short' }).format(moment);
  return `${day} ${time}`;
}
