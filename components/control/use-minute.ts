"use client";

import { useEffect, useState } from "react";

const EVERY_MS = 15_000;

/** The time of this device, near enough to say "3 min ago"; null before the page has come alive. */
export function useMinute(): number | null {
  const [now, setNow] = useState<number | null>(null);
  useEffect(() => {
    setNow(Date.now());
    const timer = setInterval(() => setNow(Date.now()), EVERY_MS);
    return () => clearInterval(timer);
  }, []);
  return now;
}
