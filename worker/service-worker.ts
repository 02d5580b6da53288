/// <reference lib="webworker" />
import type { PrecacheEntry, SerwistGlobalConfig, SerwistPlugin } from "serwist";
import { NetworkOnly, Serwist } from "serwist";
import { flush } from "./flush";
import { flushPhotographs } from "./flush-photographs";

declare global {
  interface WorkerGlobalScope extends SerwistGlobalConfig {
    __SW_MANIFEST: (PrecacheEntry | string)[] | undefined;
  }
}
declare const self: ServiceWorkerGlobalScope;
declare const __OFFLINE_ROUTES__: string[];
type SyncEvent = ExtendableEvent & { readonly tag: string };

// A precache key for one RSC answer of an offline page: /readings?__rsc=%2F_tree or ?__rsc=full.
const RSC_KEY = "__rsc";
const rscKey = (pathname: string, segment: string | null) => `${pathname}?${RSC_KEY}=${encodeURIComponent(segment ?? "full")}`;

// At install: turns such a key into the request that Next answers with that payload. The server redirects it once
// to the URL with the right ?_rsc= hash; fetch follows, keeping the headers.
const rscInstall: SerwistPlugin = {
  requestWillFetch: async ({ request }) => {
    const url = new URL(request.url);
    const segment = url.searchParams.get(RSC_KEY);
    if (segment === null) return request;
    const headers = new Headers({ RSC: "1" });
    if (segment !== "full") {
      headers.set("Next-Router-Prefetch", "1");
      headers.set("Next-Router-Segment-Prefetch", segment);
    }
    return new Request(url.pathname, { headers, credentials: "same-origin", cache: "no-store" });
  },
  // a sign-in page, an error or a wrong kind of answer is never kept under an offline key
  cacheWillUpdate: async ({ request, response }) => {
    if (response.status !== 200) return null;
    const type = response.headers.get("content-type") ?? "";
    if (request.url.includes(`?${RSC_KEY}=`)) return type.startsWith("text/x-component") ? response : null;
    if (response.redirected) return null;
    return response;
  },
};

// A Web Worker is started from a URL with "#params=…". A stored answer carries its own URL, without the fragment, and
// the worker would take that as its location. An answer without a URL leaves the request's in place.
const workerLocation: SerwistPlugin = {
  handlerWillRespond: async ({ request, response }) =>
    request.destination === "worker" || request.destination === "sharedworker"
      ? new Response(response.body, { status: response.status, headers: response.headers })
      : response,
};

const serwist = new Serwist({
  precacheEntries: self.__SW_MANIFEST,
  precacheOptions: { cleanupOutdatedCaches: true, cleanURLs: false, directoryIndex: null, plugins: [rscInstall, workerLocation] },
  skipWaiting: false,
  clientsClaim: true,
  navigationPreload: false,
  runtimeCaching: [
    // 1. RSC payloads of the offline pages, whatever page asks and whatever its ?_rsc= hash is
    {
      matcher: ({ url, request, sameOrigin }) =>
        sameOrigin && request.headers.get("RSC") === "1" && __OFFLINE_ROUTES__.includes(url.pathname),
      handler: async ({ url, request }) => {
        const hit = await serwist.matchPrecache(rscKey(url.pathname, request.headers.get("Next-Router-Segment-Prefetch")));
        return hit ?? fetch(request as Request);
      },
    },
    // 2. documents of the offline pages, whatever their query string is
    {
      matcher: ({ url, request, sameOrigin }) => sameOrigin && request.mode === "navigate" && __OFFLINE_ROUTES__.includes(url.pathname),
      handler: async ({ url, request }) => (await serwist.matchPrecache(url.pathname)) ?? fetch(request as Request),
    },
    // 3. every other document: the server, else the offline page. Nothing is stored.
    {
      matcher: ({ request, sameOrigin }) => sameOrigin && request.mode === "navigate",
      handler: async ({ request }) => {
        try {
          return await fetch(request as Request);
        } catch {
          return (await serwist.matchPrecache("/offline")) ?? Response.error();
        }
      },
    },
    { matcher: ({ url, sameOrigin }) => sameOrigin && url.pathname.startsWith("/api/"), method: "GET", handler: new NetworkOnly() },
  ],
});

// the page asks for the change-over once the person agrees and no entry is unfinished
self.addEventListener("message", (event) => {
  if (event.data?.type === "SKIP_WAITING") void self.skipWaiting();
});

// Background Sync, where the browser has it: a queue that did not drain is tried again by the browser in its own time
self.addEventListener("sync", (event) => {
  const { tag, waitUntil } = event as SyncEvent;
  if (tag === "flush") waitUntil.call(event, drained());
});

async function drained(): Promise<void> {
  const reach = await flush({ urgent: false });
  const photographs = reach === "reached" ? await flushPhotographs({ urgent: false }) : null;
  if (reach === "no-answer" || photographs === "no-answer") throw new Error("nobody answered: try again later");
}

serwist.addEventListeners();
