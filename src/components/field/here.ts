/** Who is at this phone now. Kept for the tab only: a killed app asks for the PIN again. */
import { useSyncExternalStore } from 'react';

export interface Here {
  person: string;
  name: string;
}

const key = 'coldloop.here';
const listeners = new Set<() => void>();
let kept: { raw: string | null; here: Here | null } = { raw: null, here: null };

function parse(raw: string | null): Here | null {
  if (!raw) return null;
  const [person, name] = raw.split('\n');
  return person && name ? { person, name } : null;
}

function read(): Here | null {
  const raw = sessionStorage.getItem(key);
  if (raw !== kept.raw) kept = { raw, here: parse(raw) };
  return kept.here;
}

/** Says who is here after their PIN was right (or right after they were set up); null when they leave. */
export function setHere(here: Here | null): void {
  if (here) sessionStorage.setItem(key, `${here.person}\n${here.name}`);
  else sessionStorage.removeItem(key);
  listeners.forEach((listener) => {
    listener();
  });
}

/** Somebody signs in: unless they are who is here, their own PIN is asked for. */
export function leaveUnless(person: string): void {
  if (read()?.person !== person) setHere(null);
}

export function useHere(): Here | null {
  return useSyncExternalStore((listener) => {
    listeners.add(listener);
    return () => listeners.delete(listener);
  }, read);
}
