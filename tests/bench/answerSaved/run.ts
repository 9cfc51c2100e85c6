/** Times a saved answer in Debian's Chromium against a bare IndexedDB write. */
import { createServer } from 'node:http';
import type { AddressInfo } from 'node:net';
import { launch } from '../../support/browser/chromium';
import { build } from 'vite';
import type { AnswerSaved } from './page';

const aim = 2;

async function bundle(): Promise<string> {
  const built = await build({
    configFile: false,
    logLevel: 'error',
    build: {
      write: false,
      lib: { entry: new URL('./page.ts', import.meta.url).pathname, formats: ['iife'], name: 'bench' },
    },
  });
  const [first] = [built].flat();
  const chunk = first && 'output' in first ? first.output[0] : undefined;
  if (!chunk) throw new Error('the bench page was not built');
  return chunk.code;
}

const percentile = (values: number[], share: number): number =>
  [...values].sort((a, b) => a - b)[Math.floor(values.length * share)] ?? 0;

export async function answerSaved(): Promise<string> {
  const code = await bundle();
  const server = createServer((_request, response) => {
    response.setHeader('content-type', 'text/html; charset=utf-8');
    response.end(
      `<!doctype html><html lang="en"><title>bench</title><script>${code.replaceAll('</script', '<\\/script')}</script></html>`,
    );
  });
  await new Promise<void>((resolve) => server.listen(0, '127.0.0.1', resolve));
  const browser = await launch();
  try {
    const page = await browser.newPage();
    await page.goto(`http://localhost:${(server.address() as AddressInfo).port}/`);
    const { store, bare } = await page.evaluate<AnswerSaved>(() => window.measure());
    const line = (name: string, share: number) => {
      const [ours, theirs] = [percentile(store, share), percentile(bare, share)];
      return `${name}: ${ours.toFixed(2)} ms, bare write ${theirs.toFixed(2)} ms, ratio ${(ours / theirs).toFixed(2)} (aim ${aim})`;
    };
    return [`answer saved, ${store.length} answers`, line('  median', 0.5), line('  95 of 100', 0.95)].join(
      '\n',
    );
  } finally {
    await browser.close();
    server.close();
  }
}
