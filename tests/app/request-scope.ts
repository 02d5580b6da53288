import { workAsyncStorage } from "next/dist/server/app-render/work-async-storage.external";
import { workUnitAsyncStorage } from "next/dist/server/app-render/work-unit-async-storage.external";
import { HeadersAdapter } from "next/dist/server/web/spec-extension/adapters/headers";
import { RequestCookiesAdapter } from "next/dist/server/web/spec-extension/adapters/request-cookies";
import { RequestCookies } from "next/dist/server/web/spec-extension/cookies";

type WorkStore = Parameters<typeof workAsyncStorage.run>[0];
type UnitStore = Parameters<typeof workUnitAsyncStorage.run>[0];

/** Runs work as Next runs a page: `cookies()` and `headers()` are those of a request with this cookie. */
export function inRequest<T>(cookie: string, work: () => Promise<T>): Promise<T> {
  const headers = new Headers(cookie === "" ? {} : { cookie });
  const request = {
    type: "request",
    phase: "render",
    url: { pathname: "/", search: "" },
    headers: HeadersAdapter.seal(headers),
    cookies: RequestCookiesAdapter.seal(new RequestCookies(headers)),
  } as Partial<UnitStore> as UnitStore;
  const route = { route: "/", forceStatic: false } as Partial<WorkStore> as WorkStore;
  return workAsyncStorage.run(route, () => workUnitAsyncStorage.run(request, work));
}
