/** Answers the page about the app's own files as this worker holds them. */
import { cacheNames } from 'workbox-core';
import { getCacheKeyForURL, matchPrecache, type PrecacheEntry } from 'workbox-precaching';
import { namesIn } from './namesIn';
import type { ShellAnswers, ShellQuestion } from './shellMessages';

const hex = (bytes: ArrayBuffer): string =>
  [...new Uint8Array(bytes)].map((byte) => byte.toString(16).padStart(2, '0')).join('');

/** The set of files by name and content: hashed names carry their content, the others their revision. */
async function versionOf(files: PrecacheEntry[]): Promise<string> {
  const names = files.map(({ url, revision }) => `${url} ${revision ?? ''}`).sort();
  return hex(await crypto.subtle.digest('SHA-256', new TextEncoder().encode(names.join('\n'))));
}

async function isHeld(url: string): Promise<boolean> {
  const response = await matchPrecache(url);
  return response?.ok === true && (await response.arrayBuffer()).byteLength > 0;
}

async function missing(files: PrecacheEntry[]): Promise<PrecacheEntry[]> {
  const held = await Promise.all(files.map(({ url }) => isHeld(url)));
  return files.filter((_, index) => !held[index]);
}

/** Opens the page as a cold start does: it, and all that it and its files name, from the cache; never the network. */
async function opens(page: string): Promise<boolean> {
  const waiting = [new URL(page, self.location.origin).href];
  const seen = new Set(waiting);
  for (let url = waiting.pop(); url !== undefined; url = waiting.pop()) {
    const response = getCacheKeyForURL(url) === undefined ? undefined : await matchPrecache(url);
    if (!response?.ok) return false;
    for (const next of namesIn(url, await response.text())) {
      if (!seen.has(next)) waiting.push(next);
      seen.add(next);
    }
  }
  return true;
}

async function mend(files: PrecacheEntry[]): Promise<boolean> {
  const cache = await caches.open(cacheNames.precache);
  for (const { url } of await missing(files)) {
    const response = await fetch(url, { cache: 'reload' }).catch(() => undefined);
    const key = getCacheKeyForURL(url);
    if (response?.ok && key !== undefined) await cache.put(key, response);
  }
  return (await missing(files)).length === 0;
}

export async function answerShellQuestion(
  { type }: ShellQuestion,
  files: PrecacheEntry[],
  page: string,
): Promise<ShellAnswers[keyof ShellAnswers]> {
  if (type === 'SHELL_OPENS') return opens(page);
  if (type === 'SHELL_MEND') return mend(files);
  return (await missing(files)).length === 0 ? versionOf(files) : null;
}
