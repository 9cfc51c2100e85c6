/** The sentences of a record's PDF, in the language it was signed in, and its times in the signer's zone. */
import type { Language } from '../../../../shared/api/common';
import type { RecordDocument } from '../../../../shared/api/recordDocument';
import type { Text } from '../../../../shared/panel/says';
import { render, type WordingKey } from '../../../../shared/wording/render';

export interface RecordWords {
  t: (key: WordingKey, params?: Text['params']) => string;
  say: (text: Text) => string;
  /** `2026-12-01 11:42`, or `–` for none. */
  at: (instant: string | null) => string;
  zone: string;
}

/** A zone that this server does not know is shown as UTC, and named so. */
function formatOf(zone: string): { format: Intl.DateTimeFormat; zone: string } {
  const options = { dateStyle: 'short', timeStyle: 'short' } as const;
  try {
    return { format: new Intl.DateTimeFormat('sv-SE', { ...options, timeZone: zone }), zone };
  } catch {
    return { format: new Intl.DateTimeFormat('sv-SE', { ...options, timeZone: 'UTC' }), zone: 'UTC' };
  }
}

export function recordWords(document: RecordDocument): RecordWords {
  const language: Language = document.language;
  const { format, zone } = formatOf(document.signatures.at(-1)?.zone ?? 'UTC');
  const say = (text: Text) => render(language, text);
  return {
    say,
    t: (key, params) => say(params ? { key, params } : { key }),
    at: (instant) => (instant === null ? '–' : format.format(new Date(instant))),
    zone,
  };
}
