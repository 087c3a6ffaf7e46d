import { clientsClaim } from 'workbox-core';
import { ExpirationPlugin } from 'workbox-expiration';
import { cleanupOutdatedCaches, createHandlerBoundToURL, precacheAndRoute } from 'workbox-precaching';
import { NavigationRoute, registerRoute } from 'workbox-routing';
import { CacheFirst, NetworkFirst } from 'workbox-strategies';
import { isKept, KEPT_ANSWERS, signsOut } from './kept-answers.ts';

/*
 * Opens the product without a connection: its files are kept when a version is first met, and what the API was asked
 * for is kept as it was last answered. Nothing is written from here; records wait in the page's own storage.
 */

declare const self: ServiceWorkerGlobalScope;
/** the built files, put in by the build */
declare const __BUILT_FILES__: { url: string; revision: string | null }[];

/** A line that says nothing for so long counts as none, s. */
const PATIENCE = 8;
const DAY = 86_400;

precacheAndRoute(__BUILT_FILES__);
cleanupOutdatedCaches();
clientsClaim();

// Addresses of the client, whatever they are; those of the API and of files are their own.
registerRoute(
  new NavigationRoute(createHandlerBoundToURL('/index.html'), { denylist: [/^\/api\//, /\.\w+$/] }),
);

// Large files that not everybody needs, such as the solver, are kept once they were fetched.
registerRoute(
  ({ url }) => url.origin === self.location.origin && url.pathname.startsWith('/assets/'),
  new CacheFirst({ cacheName: 'featherbeam-large', plugins: [new ExpirationPlugin({ maxEntries: 8 })] }),
);

registerRoute(
  ({ url }) => url.origin === self.location.origin && isKept(url.pathname),
  new NetworkFirst({
    cacheName: KEPT_ANSWERS,
    networkTimeoutSeconds: PATIENCE,
    plugins: [
      {
        cacheWillUpdate: async ({ response }) => (response.status === 200 ? response : null),
        // Whoever is not signed in any more leaves nothing of theirs behind.
        fetchDidSucceed: async ({ request, response }) => {
          if (await signsOut(request.url, response.clone())) await caches.delete(KEPT_ANSWERS);
          return response;
        },
      },
      new ExpirationPlugin({ maxEntries: 500, maxAgeSeconds: 60 * DAY }),
    ],
  }),
);

// Another person, or none: what the last one saw goes.
for (const method of ['POST', 'DELETE'] as const) {
  registerRoute(
    ({ url }) => url.pathname === '/api/session' || url.pathname === '/api/account',
    async ({ request }) => {
      const response = await fetch(request);
      if (response.ok) await caches.delete(KEPT_ANSWERS);
      return response;
    },
    method,
  );
}

// A newer version waits until the reader takes it, or until the last window of the old one is closed.
self.addEventListener('message', ({ data }: ExtendableMessageEvent) => {
  if (data === 'take over') void self.skipWaiting();
});
