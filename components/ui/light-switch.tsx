"use client";

import { useSyncExternalStore } from "react";

/** Deck light or below light, one tap, remembered on this device. Compact: a sun or a lamp, where a phone has no room for words. */
export function LightSwitch({ compact = false }: { compact?: boolean }) {
  const light = useSyncExternalStore(onLightChange, currentLight, () => "deck");
  const other = light === "deck" ? "below" : "deck";
  return (
    <button
      type="button"
      onClick={() => setLight(other)}
      aria-label={`Light: ${light}. Change to ${other} light`}
      className={`inline-flex min-h-tap min-w-tap items-center justify-center gap-2 rounded border border-ink-line text-small ${compact ? "" : "px-3"}`}
    >
      {light === "deck" ? <Sun /> : <Lamp />}
      {compact ? null : light === "deck" ? "Deck light" : "Below light"}
    </button>
  );
}

function Sun() {
  return (
    <svg viewBox="0 0 20 20" className="h-5 w-5" aria-hidden="true">
      <circle cx="10" cy="10" r="4" className="fill-batten stroke-ink" strokeWidth="1.4" />
      <path
        d="M10 1v3M10 16v3M1 10h3M16 10h3M3.6 3.6l2.1 2.1M14.3 14.3l2.1 2.1M16.4 3.6l-2.1 2.1M5.7 14.3l-2.1 2.1"
        className="stroke-ink"
        strokeWidth="1.4"
      />
    </svg>
  );
}

function Lamp() {
  return (
    <svg viewBox="0 0 20 20" className="h-5 w-5 fill-none stroke-ink" strokeWidth="1.4" aria-hidden="true">
      <path d="M10 1v3M6.5 4h7M6 17h8M7 4.5h6l1.5 4v5L13 16.5H7L5.5 13.5v-5Z" />
      <circle cx="10" cy="11" r="1.8" className="fill-batten stroke-none" />
    </svg>
  );
}

function currentLight(): "deck" | "below" {
  return document.documentElement.dataset.light === "below" ? "below" : "deck";
}

function setLight(light: "deck" | "below") {
  document.documentElement.dataset.light = light;
  localStorage.setItem("light", light);
}

function onLightChange(changed: () => void): () => void {
  const observer = new MutationObserver(changed);
  observer.observe(document.documentElement, { attributeFilter: ["data-light"] });
  return () => observer.disconnect();
}
