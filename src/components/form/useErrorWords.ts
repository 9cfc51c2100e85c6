import type { WordingKey } from '../../../shared/wording/render';
import { heldMessage } from '../wording/held';
import { useWords } from '../words';

/** Turns a field's error into words: form schemas give wording keys as messages, the server gives sentences. */
export function useErrorWords(): (error: { message?: string | undefined } | undefined) => string | undefined {
  const { t, language } = useWords();
  return (error) => {
    if (!error) return undefined;
    const message = error.message ?? '';
    return heldMessage(language, message) === undefined
      ? message || t('app.required')
      : t(message as WordingKey);
  };
}
