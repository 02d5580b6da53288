"use client";

import { useState } from "react";
import { Button } from "@/components/ui/button";
import { QrCode } from "@/components/ui/qr-code";
import { actWords, valueWords } from "./event-words";
import type { Held } from "./use-held-events";

/** One event as a QR code: the same bytes and signature that would have been sent. */
export function ScanByLead({ held }: { held: readonly Held[] }) {
  const [at, setAt] = useState(0);
  const shown = held[at];
  if (!shown) return <p>Nothing to show yet.</p>;
  const text = JSON.stringify({ protocol: 1, device: shown.event.device, holds: held.length, events: [shown.event.envelope] });
  return (
    <div className="flex flex-col items-center gap-2 rounded border-2 border-ink bg-sailcloth-raised p-3">
      <div className="w-full [&>svg]:max-w-none">
        <QrCode text={text} label={`Code of event ${shown.event.seq}`} />
      </div>
      <p className="text-center">
        <b>{actWords(shown.body)}</b> · <span className="font-mono">{valueWords(shown.body)}</span>
      </p>
      <div className="flex w-full gap-2">
        <Button className="min-h-key flex-1" disabled={at >= held.length - 1} onClick={() => setAt(at + 1)}>
          Earlier
        </Button>
        <Button className="min-h-key flex-1" disabled={at === 0} onClick={() => setAt(at - 1)}>
          Later
        </Button>
      </div>
    </div>
  );
}
