import { answer, type Refusal, type Result, refuse } from "@/lib/result";

/** All that keeps a test from being reduced, each with its path in the record where one place is to blame. */
export type Faults = { readonly type: "Faults"; readonly faults: readonly Refusal[] };

/** A refusal that holds every fault found. */
export function refuseFaults(faults: readonly Refusal[]): { readonly ok: false; readonly refusal: Faults } {
  return refuse({ type: "Faults", faults });
}

/** Every answer, or every refusal. */
export function gathered<T>(results: readonly Result<T>[]): Result<readonly T[], Faults> {
  const faults = faultsOf(...results);
  return faults.length > 0 ? refuseFaults(faults) : answer(results.flatMap((result) => (result.ok ? [result.value] : [])));
}

/** The refusals behind results of any kind; one that holds several gives each of them. */
export function faultsOf(...results: readonly Result<unknown>[]): readonly Refusal[] {
  return results.flatMap((result) => (result.ok ? [] : faultsIn(result.refusal)));
}

/** The same result with its refusals placed inside a part of the record. */
export function inside<T>(path: string, result: Result<T>): Result<T, Faults> {
  if (result.ok) return result;
  return refuseFaults(faultsIn(result.refusal).map((fault) => ({ ...fault, path: joined(path, fault.path) })));
}

function joined(path: string, inner: string | undefined): string {
  if (inner === undefined || inner === "") return path;
  return inner.startsWith("[") ? path + inner : `${path}.${inner}`;
}

function faultsIn(refusal: Refusal): readonly Refusal[] {
  return isFaults(refusal) ? refusal.faults : [refusal];
}

function isFaults(refusal: Refusal): refusal is Faults {
  return refusal.type === "Faults" && "faults" in refusal;
}
