"use client";

import { useSyncExternalStore } from "react";

/** Deck light or below light, one tap, remembered on this device. */
export function LightSwitch() {
  const light = useSyncExternalStore(onLightChange, currentLight, () => "deck");
  const other = light === "deck" ? "below" : "deck";
  return (
    <button
      type="button"
      onClick={() => setLight(other)}
      aria-label={`Light: ${light}. Change to ${other} light`}
      className="inline-flex min-h-tap min-w-tap items-center gap-2 rounded border border-ink-line px-3 text-small"
    >
      <span aria-hidden="true" className={`h-3 w-3 rounded-full border border-ink ${light === "deck" ? "bg-batten" : "bg-ink"}`} />
      {light === "deck" ? "Deck light" : "Below light"}
    </button>
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
