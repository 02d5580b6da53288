import { useMemo } from "react";
import { useOwnReadings } from "../task/use-own-readings";

/** The slots this phone has read; undefined until the store has answered. */
export function useReadKeys(test: string): ReadonlySet<string> | undefined {
  const own = useOwnReadings(test);
  return useMemo(() => own && new Set(own.map(({ slotKey }) => slotKey)), [own]);
}
