"use client";

import { useEffect, useState } from "react";
import { PHOTOGRAPHS_A_READING } from "@/lib/sync/photograph";
import { troubleInWords } from "./trouble-in-words";
import type { Beside, usePhotographs } from "./use-photographs";

/** Photographs of what is being read, in one line above it: taken with the camera, or left out. Nothing waits for them. */
export function PhotographStrip({ beside, busy, trouble, take, drop }: ReturnType<typeof usePhotographs>) {
  const isFull = beside.length >= PHOTOGRAPHS_A_READING;
  return (
    <section aria-label="Photographs of this reading" className={`flex flex-col gap-1 ${trouble ? "" : "-mb-3"}`}>
      <div className="flex h-11 items-stretch gap-2">
        {beside.map((each, index) => (
          <Thumb key={each.sha256} of={each} no={index + 1} onDrop={() => drop(each.sha256)} />
        ))}
        {isFull ? null : <Camera busy={busy} first={beside.length === 0} onTake={take} />}
      </div>
      {trouble ? (
        <p role="status" className="border-redlead border-l-4 bg-redlead-wash px-2 py-1 text-small leading-tight">
          {troubleInWords(trouble)}
        </p>
      ) : null}
    </section>
  );
}

type CameraProps = { busy: boolean; first: boolean; onTake: (file: File) => void };

function Camera({ busy, first, onTake }: CameraProps) {
  return (
    <label className="flex min-w-0 flex-1 items-center gap-2 rounded border-2 border-ink-line px-3 text-small leading-tight focus-within:outline focus-within:outline-2">
      <CameraSign />
      <span className="font-bold">{busy ? "Keeping it" : "Photograph"}</span>
      {first ? <span className="min-w-0 text-ink-soft">kept without its place</span> : null}
      <input
        type="file"
        accept="image/*"
        capture="environment"
        aria-label="Photograph"
        className="sr-only"
        disabled={busy}
        onChange={({ target }) => {
          const file = target.files?.[0];
          if (file) onTake(file);
          // the same file again is a choice too
          target.value = "";
        }}
      />
    </label>
  );
}

function Thumb({ of, no, onDrop }: { of: Beside; no: number; onDrop: () => void }) {
  const address = useAddress(of.picture);
  return (
    <button
      type="button"
      onClick={onDrop}
      aria-label={`Take out photograph ${no}`}
      className="relative h-11 w-11 shrink-0 rounded border border-ink-line bg-center bg-cover"
      style={address === null ? undefined : { backgroundImage: `url(${address})` }}
    >
      <span aria-hidden="true" className="absolute top-0 right-0 rounded bg-ink px-1 text-sailcloth text-small leading-tight">
        ×
      </span>
    </button>
  );
}

function useAddress(picture: Blob): string | null {
  const [address, setAddress] = useState<string | null>(null);
  useEffect(() => {
    const made = URL.createObjectURL(picture);
    setAddress(made);
    return () => URL.revokeObjectURL(made);
  }, [picture]);
  return address;
}

function CameraSign() {
  return (
    <svg viewBox="0 0 24 24" className="h-5 w-5 shrink-0" aria-hidden="true">
      <path d="M3 8h4l2-3h6l2 3h4v11H3z" fill="none" stroke="currentColor" strokeWidth="2" strokeLinejoin="round" />
      <circle cx="12" cy="13" r="3.5" fill="none" stroke="currentColor" strokeWidth="2" />
    </svg>
  );
}
