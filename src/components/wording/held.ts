/** The messages this page holds: fetched a language and an area at a time, so that a phone carries only its own. */
import type { Language } from '../../../shared/api/common';
import type { Text } from '../../../shared/panel/says';
import { renderWith } from '../../../shared/wording/renderWith';

type Messages = Readonly<Record<string, string>>;
/** `desk` are the messages that only the office pages show. */
export type Area = 'phone' | 'desk';

const fetchers: Record<Language, Record<Area, () => Promise<Messages>>> = {
  en: {
    phone: async () => (await import('../../../shared/wording/en/phone')).phone,
    desk: async () => (await import('../../../shared/wording/en/desk')).desk,
  },
  es: {
    phone: async () => (await import('../../../shared/wording/es/phone')).phone,
    desk: async () => (await import('../../../shared/wording/es/desk')).desk,
  },
};
const held: Record<Language, Partial<Record<Area, Messages>>> = { en: {}, es: {} };
const wanted = new Set<Area>(['phone']);

async function fetchArea(language: Language, area: Area): Promise<void> {
  held[language][area] ??= await fetchers[language][area]();
}

/** Every area that some page has asked for so far, in this language. */
export async function holdLanguage(language: Language): Promise<void> {
  await Promise.all([...wanted].map((area) => fetchArea(language, area)));
}

/** From now on this area is held in whatever language is shown. */
export async function holdArea(area: Area, language: Language): Promise<void> {
  wanted.add(area);
  await fetchArea(language, area);
}

/**
 * A sentence from what a pack carries or else from what is held.
 * @throws Error when neither has it
 */
export const renderHeld = (language: Language, text: Text, carried?: Messages): string =>
  renderWith([carried, held[language].phone, held[language].desk], language, text);

export const heldMessage = (language: Language, key: string): string | undefined =>
  held[language].phone?.[key] ?? held[language].desk?.[key];
