import { useEffect, useState } from "react";
import { type Check, selfTest } from "./self-test";

/** What this browser can do, once it has been tried; null until then. */
export function useSelfTest(): readonly Check[] | null {
  const [checks, setChecks] = useState<readonly Check[] | null>(null);
  useEffect(() => {
    let gone = false;
    selfTest().then((found) => gone || setChecks(found));
    return () => {
      gone = true;
    };
  }, []);
  return checks;
}
