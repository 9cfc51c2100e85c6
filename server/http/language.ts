/** The language an answer is written in: that of the screen that asks, else the person's own. */
import type { Request } from 'express';
import type { Language } from '../../shared/api/common';

export function languageOf(request: Request): Language {
  const asked = request.get('accept-language') === undefined ? false : request.acceptsLanguages('en', 'es');
  return asked === 'en' || asked === 'es' ? asked : (request.user?.language ?? 'en');
}
