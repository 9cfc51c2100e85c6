/** Runs in the browser: an answer through the real device store, beside a bare write of the same durability. */
import { openDB } from 'idb';
import { browserEnvironment } from '../../../src/offline/browserEnvironment';
import { LocalDeviceStore } from '../../../src/offline/deviceStore';
import { electrician, jobId, samplePack } from '../../support/fieldHarness/samplePack';

export interface AnswerSaved {
  store: number[];
  bare: number[];
}

const answers = 300;
const json = (body: unknown) =>
  new Response(JSON.stringify(body), { headers: { 'content-type': 'application/json' } });

/** Enough of a server to enrol and fetch one pack; it takes no entries, as in a basement. */
const basement: typeof fetch = (input) => {
  const url = typeof input === 'string' ? input : input instanceof URL ? input.href : input.url;
  if (url.includes('/entries')) return Promise.reject(new TypeError('no signal'));
  if (!url.includes('/my/packs'))
    return Promise.resolve(json({ id: jobId, person: { id: electrician.person } }));
  const { digest } = samplePack;
  return Promise.resolve(json({ packs: [samplePack], current: [{ job: jobId, digest, status: 'sent' }] }));
};

async function timeOf(run: () => Promise<unknown>): Promise<number> {
  const start = performance.now();
  await run();
  return performance.now() - start;
}

async function measure(): Promise<AnswerSaved> {
  const store = new LocalDeviceStore({
    ...browserEnvironment({ language: () => 'en', say: ({ key }) => key }),
    fetch: basement,
  });
  const me = { id: electrician.person, name: electrician.name, email: electrician.email };
  await store.enrol(me, '481516');
  await store.sendNow();
  const bare = await openDB('bare', 1, {
    upgrade: (database) => void database.createObjectStore('rows', { keyPath: 'id' }),
  });
  const step = samplePack.checklist.steps[0]?.id ?? '';
  const body = {
    step,
    value: { kind: 'reading' as const, value: 0.4 },
    shown: 'Measure',
    language: 'en' as const,
  };
  const measured: AnswerSaved = { store: [], bare: [] };
  // Taken in turns, so that whatever else the machine does falls on both.
  for (let n = 0; n < answers; n += 1) {
    let row: object = {};
    measured.store.push(
      await timeOf(async () => {
        row = await store.append(me.id, jobId, 'answer', body);
      }),
    );
    measured.bare.push(
      await timeOf(async () => {
        const transaction = bare.transaction('rows', 'readwrite', { durability: 'strict' });
        await Promise.all([transaction.store.add(row), transaction.done]);
      }),
    );
  }
  return measured;
}

declare global {
  interface Window {
    measure: typeof measure;
  }
}
window.measure = measure;
