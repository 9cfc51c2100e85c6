import { describe, expect, test } from 'vitest';
import { backoffMs } from '../../../src/offline/backoff';
import { batch } from '../../../src/offline/batch';
import { deviceName } from '../../../src/offline/deviceName';
import { lockedRound } from '../../../src/offline/lockedRound';
import { offlineSupport } from '../../../src/offline/offlineSupport';
import { retryAfterMs } from '../../../src/offline/serverCall';
import { namesIn } from '../../../src/offline/serviceWorker/namesIn';
import type { Entry } from '../../../shared/job/entry';

const whole = {
  isSecureContext: true,
  crypto: { subtle: {} },
  indexedDB: {},
  BroadcastChannel: {},
  navigator: { serviceWorker: {}, storage: { persisted: () => true } },
};
test.each([
  ['a whole browser', whole, []],
  ['a page without HTTPS', { isSecureContext: false, navigator: {} }, ['device.store.support.insecure']],
  ['no keys', { ...whole, crypto: {} }, ['device.store.support.keys']],
  ['no database', { ...whole, indexedDB: undefined }, ['device.store.support.database']],
  [
    'a private window',
    { ...whole, navigator: { storage: whole.navigator.storage } },
    ['device.store.support.worker'],
  ],
  ['an old browser', { ...whole, BroadcastChannel: undefined }, ['device.store.support.old']],
])('support: %s', (_name, browser, reasons) => {
  const support = offlineSupport(browser);
  expect(support.ok ? [] : support.reasons.map(({ key }) => key)).toEqual(reasons);
});

// The header texts are from memory of what these browsers send.
test.each([
  [
    'Mozilla/5.0 (Linux; Android 10; K) AppleWebKit/537.36 (KHTML, like Gecko) Chrome/140.0.0.0 Mobile Safari/537.36',
    'Chrome on Android',
  ],
  [
    'Mozilla/5.0 (iPhone; CPU iPhone OS 18_5 like Mac OS X) AppleWebKit/605.1.15 (KHTML, like Gecko) Version/18.5 Mobile/15E148 Safari/604.1',
    'Safari on iPhone',
  ],
  [
    'Mozilla/5.0 (Windows NT 10.0; Win64; x64) AppleWebKit/537.36 (KHTML, like Gecko) Chrome/140.0.0.0 Safari/537.36 Edg/140.0.0.0',
    'Edge on Windows',
  ],
  ['Mozilla/5.0 (X11; Linux x86_64; rv:140.0) Gecko/20100101 Firefox/140.0', 'Firefox on Linux'],
  ['something else', 'Browser'],
])('device: %s', (agent, name) => {
  expect(deviceName(agent)).toBe(name);
});

test.each([
  [1, 0, 1_000],
  [1, 0.999, 1_998],
  [3, 0.5, 4_000],
  [30, 0.5, 150_000],
  [30, 0, 1_000],
])('%i failures with jitter %d wait %i ms', (failures, random, ms) => {
  expect(Math.round(backoffMs(failures, random))).toBe(ms);
});

test.each([
  [null, null],
  ['90', 90_000],
  ['Tue, 01 Dec 2026 08:00:30 GMT', 30_000],
  ['Tue, 01 Dec 2026 07:00:00 GMT', 0],
  ['soon', null],
])('Retry-After %s', (header, ms) => {
  expect(retryAfterMs(header, Date.parse('2026-12-01T08:00:00Z'))).toBe(ms);
});

describe('a batch', () => {
  const entries = (count: number, bytes: number) =>
    Array.from(
      { length: count },
      (_, index) => ({ id: String(index), body: { words: 'x'.repeat(bytes) } }) as unknown as Entry,
    );
  test.each([
    ['stops at 500', entries(600, 10), 1000, 500],
    ['stops at the limit', entries(600, 10), 7, 7],
    ['stops under a megabyte', entries(100, 60_000), 500, 16],
    ['has one at least', entries(2, 2_000_000), 500, 1],
  ])('%s', (_name, given, limit, taken) => {
    expect(batch(given, limit)).toHaveLength(taken);
  });
});

test.each([
  [
    'https://a.test/index.html',
    '<script src="/assets/a.js"></script><link href="/b.css"><a href="https://other.test/x">',
    ['https://a.test/assets/a.js', 'https://a.test/b.css'],
  ],
  [
    'https://a.test/assets/a.js',
    'import{x}from"./b-1.js";import"./c.js";const d=()=>import(`./d.js`);const e="./not.js"',
    ['https://a.test/assets/b-1.js', 'https://a.test/assets/c.js', 'https://a.test/assets/d.js'],
  ],
  ['https://a.test/assets/a.css', '@font-face{src:url(/assets/f.woff2)}', ['https://a.test/assets/f.woff2']],
  ['https://a.test/icon.svg', '<a href="/x">', []],
])('names in %s', (url, text, names) => {
  expect(namesIn(url, text)).toEqual(names);
});

describe('the lock of a sending round', () => {
  /** A browser's locks as far as a round asks for them; `frozen` is a tab that holds one for ever. */
  function locks(frozen: boolean) {
    const asked: LockOptions[] = [];
    const request = (name: string, options: LockOptions, run: (lock: unknown) => Promise<boolean>) => {
      asked.push(options);
      return run(frozen && !options.steal ? null : { name });
    };
    return { asked, manager: { request } as unknown as LockManager };
  }

  test('is left to the tab that has it, and taken over only after five minutes without luck', async () => {
    let now = 0;
    let ran = 0;
    const run = () => {
      ran += 1;
      return Promise.resolve();
    };
    const { asked, manager } = locks(true);
    const round = lockedRound(manager, () => now);
    expect(await round('sending', run)).toBe(false);
    now = 300_000;
    expect(await round('sending', run)).toBe(false);
    now = 300_001;
    expect(await round('sending', run)).toBe(true);
    expect([ran, asked.at(-1)]).toEqual([1, { steal: true }]);
    expect(await round('sending', run)).toBe(false);
  });

  test('is not asked for where the browser has none', async () => {
    let ran = false;
    const round = lockedRound(undefined, () => 0);
    const answered = await round('sending', () => {
      ran = true;
      return Promise.resolve();
    });
    expect([answered, ran]).toEqual([true, true]);
  });
});
