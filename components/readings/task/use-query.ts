import { type ReadonlyURLSearchParams, useSearchParams } from "next/navigation";
import { useSyncExternalStore } from "react";

/** The query of a page whose shell was made without one: null in the shell and until it has come to life. */
export function useQuery(): ReadonlyURLSearchParams | null {
  const query = useSearchParams();
  const alive = useSyncExternalStore(
    neverChanges,
    () => true,
    () => false,
  );
  return alive ? query : null;
}

function neverChanges() {
  return () => {};
}
