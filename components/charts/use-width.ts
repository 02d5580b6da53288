"use client";

import { useEffect, useRef, useState } from "react";

/** The width a drawing really has, so that its letters keep their size on every screen. */
export function useWidth(whenUnknown: number) {
  const ref = useRef<HTMLDivElement>(null);
  const [width, setWidth] = useState(whenUnknown);
  useEffect(() => {
    const element = ref.current;
    if (!element || typeof ResizeObserver === "undefined") return;
    const observer = new ResizeObserver(([entry]) => {
      const measured = entry ? Math.round(entry.contentRect.width) : 0;
      if (measured > 0) setWidth(measured);
    });
    observer.observe(element);
    return () => observer.disconnect();
  }, []);
  return [ref, width] as const;
}
