import { useCallback, useEffect, useRef, useState } from "react";
import { dropUnfinishedEntry, keepUnfinishedEntry, unfinishedEntry } from "@/db/device/unfinished-entries";

/** What is being typed for one slot, kept on the phone with every key; null until what was left there has been read. */
export function useUnfinishedEntry<T>(test: string, slotKey: string, empty: T) {
  const [entry, setEntry] = useState<T | null>(null);
  const writing = useRef<Promise<unknown>>(Promise.resolve());
  const start = useRef(empty);

  useEffect(() => {
    let gone = false;
    unfinishedEntry(test, slotKey)
      .catch(() => null)
      .then((left) => gone || setEntry((left as T | null) ?? start.current));
    return () => {
      gone = true;
    };
  }, [test, slotKey]);

  // one write after the other: an older key must not land after a newer one
  const change = useCallback(
    (next: T) => {
      setEntry(next);
      writing.current = writing.current.then(() => keepUnfinishedEntry(test, slotKey, next)).catch(() => undefined);
    },
    [test, slotKey],
  );
  const drop = useCallback(async () => {
    setEntry(start.current);
    await writing.current;
    await dropUnfinishedEntry(test, slotKey).catch(() => undefined);
  }, [test, slotKey]);
  const settled = useCallback(() => writing.current, []);
  return { entry, change, drop, settled };
}
