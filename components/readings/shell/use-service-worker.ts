import { useCallback, useEffect, useState } from "react";
import { unfinishedCount } from "@/db/device/unfinished-entries";

// seen once: the browser never told that the new worker had taken over
const PATIENCE_MS = 4000;

/** Registers the service worker; `waiting` is a new version that asks to take over. */
export function useServiceWorker() {
  const [waiting, setWaiting] = useState<ServiceWorker | null>(null);
  useEffect(() => {
    if (!("serviceWorker" in navigator) || process.env.NODE_ENV !== "production") return;
    let gone = false;
    void navigator.serviceWorker
      .register("/service-worker.js", { updateViaCache: "none" })
      .then((registration) => !gone && watch(registration, setWaiting))
      .catch(() => undefined);
    return () => {
      gone = true;
    };
  }, []);

  const changeOver = useCallback(async () => {
    if (!waiting || (await unfinishedCount()) > 0) return false;
    const reload = () => location.reload();
    navigator.serviceWorker.addEventListener("controllerchange", reload, { once: true });
    setTimeout(reload, PATIENCE_MS);
    waiting.postMessage({ type: "SKIP_WAITING" });
    return true;
  }, [waiting]);
  return { waiting: waiting !== null, changeOver };
}

function watch(registration: ServiceWorkerRegistration, setWaiting: (worker: ServiceWorker | null) => void): void {
  const look = () => setWaiting(navigator.serviceWorker.controller ? registration.waiting : null);
  registration.addEventListener("updatefound", () => {
    registration.installing?.addEventListener("statechange", look);
  });
  look();
}
