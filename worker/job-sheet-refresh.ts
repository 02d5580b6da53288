import { deviceIdentity, updateIdentity } from "@/db/device/device-identity";
import { jobSheet, jobSheets, keepJobSheet } from "@/db/device/job-sheets";
import { jobSheetSchema } from "@/lib/sync/job-sheet";
import { browser, type Surroundings } from "./sync-request";

const PATIENCE_MS = 10_000;

/** Fetches the sheets this phone holds again, each by its tag; answers how many were new. */
export async function refreshJobSheets(around: Surroundings = browser): Promise<number> {
  const tests = (await jobSheets()).map(({ test }) => test);
  return fetchJobSheets(tests, around);
}

/** Fetches the sheet of every test the signed-in person works on; answers how many tests there are. */
export async function fetchAllJobSheets(around: Surroundings = browser): Promise<number> {
  const listed = await json(await asked("/api/v1/jobs", {}, around));
  const tests = testsIn(listed);
  await fetchJobSheets(tests, around);
  return tests.length;
}

async function fetchJobSheets(tests: readonly string[], around: Surroundings): Promise<number> {
  let fresh = 0;
  for (const test of tests) if (await fetchJobSheet(test, around)) fresh += 1;
  return fresh;
}

async function fetchJobSheet(test: string, around: Surroundings): Promise<boolean> {
  const held = await jobSheet(test);
  const response = await asked(`/api/v1/tests/${test}/job`, held?.etag ? { "if-none-match": held.etag } : {}, around);
  const parsed = jobSheetSchema.safeParse(await json(response));
  if (!parsed.success || !(await belongsHere(parsed.data.person))) return false;
  await keepJobSheet(parsed.data, response?.headers.get("etag") ?? null);
  return true;
}

/** The first sheet tells whose phone this is; another person's sheet, fetched while he signs in to send, is left. */
async function belongsHere(person: { id: string; name: string }): Promise<boolean> {
  const identity = await deviceIdentity();
  if (!identity) return false;
  if (identity.person === null) await updateIdentity({ person: { id: person.id, name: person.name } });
  return identity.person === null || identity.person.id === person.id;
}

async function asked(url: string, headers: Record<string, string>, { fetch }: Surroundings): Promise<Response | null> {
  try {
    const init = {
      headers: { accept: "application/json", ...headers },
      credentials: "same-origin",
      redirect: "manual",
      cache: "no-store",
    } as const;
    return await fetch(url, { ...init, signal: AbortSignal.timeout(PATIENCE_MS) });
  } catch {
    return null;
  }
}

async function json(response: Response | null): Promise<unknown> {
  if (response?.status !== 200) return null;
  return response.json().catch(() => null);
}

function testsIn(listed: unknown): string[] {
  const jobs = Array.isArray(listed) ? listed : [];
  return jobs.map((job: { id?: unknown }) => job.id).filter((id) => typeof id === "string");
}
