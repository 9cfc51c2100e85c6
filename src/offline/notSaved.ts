/** Turns whatever the database threw into the reason the person is told. */
import { DatabaseBlockedError } from './connection';
import { NotSavedError } from './types';

const codeByName: Record<string, NotSavedError['code']> = {
  QuotaExceededError: 'quota',
  InvalidStateError: 'closed',
  AbortError: 'closed',
  UnknownError: 'closed',
  VersionError: 'closed',
};

export function notSaved(error: unknown): NotSavedError {
  if (error instanceof NotSavedError) return error;
  if (error instanceof DatabaseBlockedError) return new NotSavedError('locked', error.message);
  const named = error instanceof Error ? error : new Error(String(error));
  return new NotSavedError(codeByName[named.name] ?? 'unknown', named.message);
}
