import "client-only";
import { deviceDatabase } from "./device-database";

/** How the sending of photographs stands; page and service worker go by the same. */
export type PhotographWait = {
  /** tries that failed in a row */
  readonly failures: number;
  /** no try before this moment, unless a person asks for one [ms since 1970] */
  readonly notBefore: number;
};

export async function photographWait(): Promise<PhotographWait> {
  const kept = await deviceDatabase().lastAnswer.get("photographs");
  return kept ? (kept.value as PhotographWait) : { failures: 0, notBefore: 0 };
}

export async function keepPhotographWait(value: PhotographWait): Promise<void> {
  await deviceDatabase().lastAnswer.put({ key: "photographs", value });
}
