import { randomUUID } from "node:crypto";
import type { Visitor } from "./visitors";

const everybody: readonly Visitor[] = ["reader", "lead", "engineer", "witness", "administrator"];
const allButReaders = everybody.filter((visitor) => visitor !== "reader");
const office: readonly Visitor[] = ["engineer", "administrator"];
const backers: readonly Visitor[] = ["lead", ...office];

/** Who may, and what a request of theirs looks like and is answered. */
export type Row = {
  /** "all": nobody need sign in */
  readonly allowed: readonly Visitor[] | "all";
  readonly body?: () => unknown;
  /** the answer to those who may; 200 where left out */
  readonly status?: number;
};

/** Pages that hold nothing of anybody and work without a server. */
const shells = [
  "",
  "join/",
  "password/",
  "offline/",
  "readings/",
  "readings/batten/",
  "readings/conditions/",
  "readings/draft/",
  "readings/held/",
  "readings/sounding/",
  "readings/water/",
];

/** Pages: who may see them. A page that is not here fails the walk. */
export const pages: Readonly<Record<string, Row["allowed"]>> = {
  ...Object.fromEntries(shells.map((folder) => [`app/${folder}page.tsx`, "all" as const])),
  "app/sign-in/page.tsx": "all",
  "app/(office)/people/page.tsx": ["administrator"],
  "app/(office)/people/[person]/page.tsx": ["administrator"],
  "app/(office)/people/mail/page.tsx": ["administrator"],
  "app/(office)/tests/page.tsx": everybody,
  "app/(office)/tests/[id]/page.tsx": everybody,
  "app/(office)/tests/[id]/plan/page.tsx": ["lead", "engineer"],
  "app/(office)/tests/[id]/control/page.tsx": allButReaders,
  "app/(office)/tests/[id]/lightship/page.tsx": ["lead", "engineer", "witness"],
  "app/(office)/tests/[id]/ledger/page.tsx": allButReaders,
  "app/(office)/tests/[id]/reconcile/page.tsx": ["lead", "engineer"],
};

const newCode = { role: "reader", personName: "Rolf" };
const newPerson = () => ({ name: "Ellen", email: `${randomUUID()}@yard.example`, isAdministrator: false, isEngineer: true });
const newDevice = () => ({ device: randomUUID(), name: "Wheelhouse", publicKey: null });

/** Route handlers, method by method. One that is not here fails the walk. */
export const handlers: Readonly<Record<string, Readonly<Record<string, Row>>>> = {
  "app/api/health/route.ts": { GET: { allowed: "all" } },
  // no folder is set here: nothing is written, and the refusal says so
  "app/api/v1/backups/route.ts": { GET: { allowed: backers }, POST: { allowed: backers, status: 503 } },
  "app/api/v1/jobs/route.ts": { GET: { allowed: everybody } },
  "app/api/v1/people/route.ts": { POST: { allowed: ["administrator"], body: newPerson, status: 201 } },
  "app/api/v1/people/[person]/route.ts": {
    PUT: { allowed: ["administrator"], body: () => ({ isAdministrator: false, isEngineer: false, isClosed: false }), status: 404 },
  },
  "app/api/v1/people/[person]/link/route.ts": { POST: { allowed: ["administrator"], status: 404 } },
  "app/api/v1/password/route.ts": { POST: { allowed: "all", body: () => ({ token: "unknown", password: "batten-and-bob" }), status: 410 } },
  "app/api/v1/password/forgotten/route.ts": { POST: { allowed: "all", body: () => ({ email: newPerson().email }), status: 202 } },
  "app/api/v1/devices/route.ts": { POST: { allowed: everybody, body: newDevice, status: 201 } },
  // nobody has taken such a photograph: who may see one is said in the route's own test
  "app/api/v1/photographs/[sha256]/route.ts": {
    GET: { allowed: everybody, status: 404 },
    HEAD: { allowed: everybody, status: 404 },
    PUT: { allowed: everybody, body: () => ({}), status: 409 },
  },
  "app/api/v1/records/route.ts": { POST: { allowed: office, body: () => ({}), status: 422 } },
  "app/api/v1/sync/route.ts": { POST: { allowed: everybody, body: () => ({ protocol: 1, device: randomUUID(), holds: 0, events: [] }) } },
  "app/api/v1/tests/[id]/job/route.ts": { GET: { allowed: everybody } },
  "app/api/v1/tests/[id]/live/route.ts": { GET: { allowed: allButReaders } },
  "app/api/v1/tests/[id]/record/route.ts": { GET: { allowed: allButReaders } },
  "app/api/v1/tests/[id]/expected/route.ts": {
    PUT: { allowed: ["engineer"], body: () => ({ displacement: 1480, lcg: 24, tcg: 0, vcg: 5.4, density: 1.02 }) },
  },
  "app/api/v1/tests/[id]/roles/route.ts": {
    PUT: { allowed: office, body: () => ({ account: randomUUID(), role: "lead", isHeld: true }), status: 404 },
  },
  "app/api/v1/tests/[id]/devices/[device]/route.ts": { DELETE: { allowed: backers, status: 404 } },
  "app/api/v1/tests/[id]/state/route.ts": {
    POST: { allowed: ["lead", "engineer"], body: () => ({ to: "planning", reason: null }), status: 409 },
  },
  "app/api/v1/tests/[id]/settings/route.ts": { PUT: { allowed: ["engineer"], body: () => ({ limits: { straightness: 0.01 } }) } },
  "app/api/v1/tests/[id]/uncertainty/route.ts": { PUT: { allowed: ["engineer"], body: () => ({ draft: 0.003 }) } },
  "app/api/v1/tests/[id]/enrolments/route.ts": {
    GET: { allowed: ["lead", "engineer", "administrator"] },
    POST: { allowed: ["lead", "engineer", "administrator"], body: () => newCode, status: 201 },
  },
  "app/api/v1/tests/[id]/enrolments/[enrolment]/route.ts": { DELETE: { allowed: ["lead", "engineer", "administrator"], status: 204 } },
};

/** Answered by the session library itself, which asks for no session. */
export const signInRoute = "app/api/auth/[...nextauth]/route.ts";
