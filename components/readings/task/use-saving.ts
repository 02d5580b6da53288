import { useRef, useState } from "react";
import { v7 as newEventId } from "uuid";
import { appendEvent, type EventDraft } from "@/db/device/append-event";
import { announceSaved } from "@/worker/sync-client";

/** A draft that the phone's store refused, under the id it keeps until it is saved. */
export type Failure = { readonly draft: EventDraft; readonly id: string };

/** Saving on this phone, once a draft is `completed`: one act at a time, and a failure that stays until it is overcome. */
export function useSaving(completed: (draft: EventDraft) => Promise<EventDraft>, onSaved: (draft: EventDraft, id: string) => void) {
  // a second tap comes before the first has been drawn
  const busy = useRef(false);
  const [saving, setSaving] = useState(false);
  const [failed, setFailed] = useState<Failure | null>(null);

  async function append(given: EventDraft, id: string = newEventId()) {
    if (busy.current) return;
    busy.current = true;
    setSaving(true);
    setFailed(null);
    const draft = await completed(given);
    try {
      await appendEvent(draft, id);
      onSaved(draft, id);
      announceSaved();
    } catch {
      setFailed({ draft, id });
    }
    busy.current = false;
    setSaving(false);
  }

  return { saving, failed, append, tryAgain: () => failed && append(failed.draft, failed.id) };
}
