"use client";

import { lazy, Suspense, useState } from "react";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { TimeOfDay } from "@/components/ui/time-of-day";
import { photographsOwedInWords, queueWords } from "@/lib/sync/queue-words";
import { useQueue } from "../shell/use-queue";
import { sendHeldEvents } from "../shell/use-sending";
import { useExportFile } from "../task/use-export-file";
import { HeldList } from "./held-list";
import { PhoneFacts } from "./phone-facts";
import { useHeldEvents } from "./use-held-events";

const ScanByLead = lazy(() => import("./scan-by-lead").then(({ ScanByLead }) => ({ default: ScanByLead })));

/** What this phone holds, how it stands, and the ways out of it: send, file, scan. */
export function HeldPage() {
  const queue = useQueue();
  const held = useHeldEvents();
  const { saveFile, saved } = useExportFile();
  const [scan, setScan] = useState(false);
  const [sending, setSending] = useState(false);
  const send = async () => {
    setSending(true);
    await sendHeldEvents().catch(() => undefined);
    setSending(false);
  };
  return (
    <div className="flex flex-col gap-3 py-1">
      <h1 className="font-bold text-title">What this phone holds</h1>
      <p className="font-bold text-large">{queue ? queueWords(queue.count, queue.reach) : "\u00a0"}</p>
      {queue && queue.photographs > 0 ? <p className="font-bold">{photographsOwedInWords(queue.photographs)}</p> : null}
      <p className="text-ink-soft text-small">
        {queue?.heardAt ? (
          <>
            Server last heard <TimeOfDay at={queue.heardAt} dated />
          </>
        ) : (
          "Server not heard yet"
        )}
      </p>
      {queue?.isStranger ? (
        <Notice tone="refused" title="Another server answers at this address">
          The readings stay on this phone: they go only to the server it was enrolled at. Tell the lead.
        </Notice>
      ) : null}
      {queue?.reach === "sign-in-needed" ? (
        <a href="/join" className="font-bold text-redlead-text underline">
          Sign in again with a code; nothing is lost meanwhile
        </a>
      ) : null}
      <div className="grid grid-cols-2 gap-2">
        <Button weight="now" className="min-h-key" disabled={sending} onClick={send}>
          {sending ? "Trying to send" : "Send now"}
        </Button>
        <Button className="min-h-key" onClick={saveFile}>
          {saved ? "File saved" : "Export file"}
        </Button>
        <Button className="col-span-2 min-h-key" aria-expanded={scan} onClick={() => setScan(!scan)}>
          {scan ? "Close the code" : "Show a reading for the lead to scan"}
        </Button>
      </div>
      {scan && held ? (
        <Suspense fallback={null}>
          <ScanByLead held={held} />
        </Suspense>
      ) : null}
      {held ? <HeldList held={held} /> : null}
      <PhoneFacts />
    </div>
  );
}
