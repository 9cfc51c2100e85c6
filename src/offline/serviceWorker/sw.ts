/** The service worker: gives the app's own files without a network, and never touches what the server says. */
import { clientsClaim } from 'workbox-core';
import {
  cleanupOutdatedCaches,
  createHandlerBoundToURL,
  precacheAndRoute,
  type PrecacheEntry,
} from 'workbox-precaching';
import { NavigationRoute, registerRoute } from 'workbox-routing';
import { answerShellQuestion } from './shellAnswers';
import type { ShellQuestion } from './shellMessages';

declare const self: ServiceWorkerGlobalScope & { __WB_MANIFEST: PrecacheEntry[] };

const files = self.__WB_MANIFEST;
const page = '/index.html';
// The server's own addresses; everything else that is navigated to is a page of this app.
const serversOwn = [/^\/api(\/|$)/, /^\/dev(\/|$)/];

cleanupOutdatedCaches();
precacheAndRoute(files);
registerRoute(new NavigationRoute(createHandlerBoundToURL(page), { denylist: serversOwn }));
clientsClaim();

self.addEventListener('message', (event) => {
  const message = event.data as ShellQuestion | { type: 'SKIP_WAITING' };
  // A new version takes over only when the person asked for it.
  if (message.type === 'SKIP_WAITING') event.waitUntil(self.skipWaiting());
  else
    event.waitUntil(
      answerShellQuestion(message, files, page).then((answer) => {
        event.ports[0]?.postMessage(answer);
      }),
    );
});
