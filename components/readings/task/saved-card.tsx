"use client";

import type { ReactNode } from "react";
import { Button } from "@/components/ui/button";
import { TakeBack } from "./take-back";

type SavedCardProps = {
  shown: string;
  corrected: boolean;
  next: ReactNode;
  onChange: () => void;
  onTakeBack: (reason: string) => void;
};

/** The large word, said only after the phone's disk has answered. */
export function SavedCard({ shown, corrected, next, onChange, onTakeBack }: SavedCardProps) {
  return (
    <div className="flex flex-1 flex-col gap-3">
      <div
        role="status"
        className="flex flex-1 flex-col items-center justify-center gap-3 rounded-lg border-2 border-batten-edge bg-batten px-4 py-8 text-center text-batten-ink"
      >
        <svg viewBox="0 0 48 48" className="h-16 w-16" aria-hidden="true">
          <path d="M8 26l11 11L40 12" fill="none" stroke="currentColor" strokeWidth="6" strokeLinecap="round" strokeLinejoin="round" />
        </svg>
        <p className="font-bold text-figure leading-tight">{corrected ? "Correction saved on this phone" : "Saved on this phone"}</p>
        <p className="text-figure">{shown}</p>
      </div>
      <div className="flex flex-wrap gap-2">
        <TakeBack onTakeBack={onTakeBack} />
        <Button className="min-h-key flex-1" onClick={onChange}>
          Correct
        </Button>
      </div>
      {next}
    </div>
  );
}
