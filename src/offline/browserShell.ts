/** Asks the service worker of this page about the app's own files. */
import type { Shell } from './environment';
import type { ShellAnswers, ShellQuestion } from './serviceWorker/shellMessages';

// Reading some eighty files from a phone's cache takes a second or two; fetching them again takes longer.
const readMs = 15_000;
const fetchMs = 120_000;

async function ask<T extends ShellQuestion['type']>(
  type: T,
  timeoutMs: number,
): Promise<ShellAnswers[T] | null> {
  const worker = navigator.serviceWorker.controller;
  if (!worker) return null;
  const { port1, port2 } = new MessageChannel();
  return new Promise((resolve) => {
    const timer = setTimeout(() => {
      resolve(null);
    }, timeoutMs);
    port1.onmessage = ({ data }: MessageEvent<ShellAnswers[T]>) => {
      clearTimeout(timer);
      port1.close();
      resolve(data);
    };
    worker.postMessage({ type }, [port2]);
  });
}

export const browserShell: Shell = {
  version: () => ask('SHELL_VERSION', readMs),
  opensOffline: async () => (await ask('SHELL_OPENS', readMs)) === true,
  mend: async () => {
    await ask('SHELL_MEND', fetchMs);
  },
};
