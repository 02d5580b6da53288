import type { Noise } from "@/lib/numerics/seeded-noise";
import { heardIn, type Line } from "./fault-phone";
import type { FaultServer } from "./fault-server";

type Reach = { readonly server: FaultServer; readonly cookie: string; readonly chance: Noise };
type Fault = (reach: Reach, text: string) => Promise<Response | null>;

const refusing = (status: number) => async () =>
  new Response(JSON.stringify({ error: "no" }), { status, headers: { "content-type": "application/json" } });

/** What can happen to a request between a phone and its server. */
export const faults: Readonly<Record<string, Fault>> = {
  "request lost": async () => null,
  "answer lost after the commit": async ({ server, cookie }, text) => {
    await server.receives(text, cookie);
    return null;
  },
  "delivered twice": async ({ server, cookie }, text) => {
    await server.receives(text, cookie);
    return server.receives(text, cookie);
  },
  "delivered twice at once": async ({ server, cookie }, text) => {
    const [first] = await Promise.all([server.receives(text, cookie), server.receives(text, cookie)]);
    return first ?? null;
  },
  "captive portal": async () => new Response("<html>Welcome</html>", { headers: { "content-type": "text/html" } }),
  "redirected to a portal": async () => new Response(null, { status: 302, headers: { location: "http://portal.example/" } }),
  "sign-in needed": async ({ server }, text) => server.receives(text, ""),
  "too large": refusing(413),
  "too often": refusing(429),
  "server error": refusing(500),
  "disk full": refusing(507),
  "cut off in the middle": async ({ server, cookie, chance }, text) =>
    server.receives(text.slice(0, Math.floor(chance.uniform() * text.length)), cookie),
  "bit flipped": async ({ server, cookie, chance }, text) => server.receives(withFlippedBit(text, chance), cookie),
  "disk failed in mid-batch": async ({ server, cookie, chance }, text) =>
    server.receivesTorn(text, cookie, Math.floor(chance.uniform() * 5)),
  "server killed and started": async ({ server }) => {
    server.stop();
    return null;
  },
};

/** A line on which, with a given chance, one of the faults happens to each request; it tells which. */
export function faultyLine(reach: Reach, share: number, tell: (fault: string) => void): Line {
  const names = Object.keys(faults);
  return async (text) => {
    if (reach.chance.uniform() >= share) return heardIn(await reach.server.receives(text, reach.cookie));
    const name = names[Math.floor(reach.chance.uniform() * names.length)] ?? "";
    tell(name);
    const response = (await faults[name]?.(reach, text)) ?? null;
    return response === null ? null : heardIn(response);
  };
}

// in the text of the events, where it can do harm: the envelope around them would only be refused
function withFlippedBit(text: string, { uniform }: Noise): string {
  const start = text.indexOf('"events"');
  const place = start + Math.floor(uniform() * (text.length - start));
  const flipped = String.fromCharCode(text.charCodeAt(place) ^ (1 << Math.floor(uniform() * 5)));
  return text.slice(0, place) + flipped + text.slice(place + 1);
}
