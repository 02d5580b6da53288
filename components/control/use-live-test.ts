"use client";

import { useEffect, useState } from "react";
import type { LiveSnapshot } from "@/lib/sync/live";

export type LiveLink = "connecting" | "live" | "away";

const RETRY_MS = 3_000;
/** the server sends something at least this often; after a longer silence the line is taken for dead */
const SILENCE_MS = 45_000;

/**
 * The test as the server sees it, kept up by server-sent events. After a cut the browser resumes behind the last cursor;
 * where it gives up, the line is opened anew and begins with a whole snapshot. What was last seen stays on the screen.
 */
export function useLiveTest(test: string, first: LiveSnapshot) {
  const [snapshot, setSnapshot] = useState(first);
  const [link, setLink] = useState<LiveLink>("connecting");
  useEffect(() => liveLine(test, setSnapshot, setLink), [test]);
  return { snapshot, link };
}

function liveLine(test: string, onSnapshot: (snapshot: LiveSnapshot) => void, onLink: (link: LiveLink) => void): () => void {
  let source: EventSource | null = null;
  let silence: ReturnType<typeof setTimeout> | undefined;
  let retry: ReturnType<typeof setTimeout> | undefined;
  const open = () => {
    source?.close();
    source = new EventSource(`/api/v1/tests/${test}/live`);
    source.onopen = heard;
    source.onerror = () => {
      onLink("away");
      if (source?.readyState === EventSource.CLOSED) retry = setTimeout(open, RETRY_MS);
    };
    source.addEventListener("beat", heard);
    source.addEventListener("snapshot", (event) => {
      heard();
      onSnapshot(JSON.parse(event.data) as LiveSnapshot);
    });
  };
  function heard() {
    onLink("live");
    clearTimeout(silence);
    silence = setTimeout(open, SILENCE_MS);
  }
  open();
  return () => {
    source?.close();
    clearTimeout(silence);
    clearTimeout(retry);
  };
}
