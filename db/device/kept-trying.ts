import "client-only";
import { freshConnection } from "./device-database";
import { NotEnrolled, StorageFailed } from "./storage-failed";

const TRIES = 3;
// a killed connection may neither succeed nor fail
const PATIENCE_MS = 4000;

/** What the work answers; after each failure it is done again on a fresh connection, three times in all. */
export async function keptTrying<T>(work: () => Promise<T>): Promise<T> {
  let cause: unknown;
  for (let attempt = 1; attempt <= TRIES; attempt++) {
    try {
      return await inTime(work());
    } catch (error) {
      if (error instanceof NotEnrolled) throw error;
      cause = error;
      await inTime(freshConnection()).catch(() => undefined);
    }
  }
  throw new StorageFailed(cause);
}

async function inTime<T>(work: Promise<T>): Promise<T> {
  let timer: ReturnType<typeof setTimeout> | undefined;
  const late = new Promise<never>((_, fail) => {
    timer = setTimeout(() => fail(new Error(`no answer from the store within ${PATIENCE_MS} ms`)), PATIENCE_MS);
  });
  try {
    return await Promise.race([work, late]);
  } finally {
    clearTimeout(timer);
  }
}
