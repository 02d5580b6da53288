import { batchesOf, phoneFileSchema } from "@/lib/sync/phone-file";
import { PROTOCOL, syncAnswerSchema } from "@/lib/sync/protocol";
import { sentPhotograph } from "@/worker/photograph-request";
import { browser } from "@/worker/sync-request";

type Taken = {
  readonly type: "taken";
  readonly phone: string;
  readonly events: number;
  readonly setAside: number;
  readonly hasUnsaved: boolean;
  /** photographs of the file that are on the server now */
  readonly photographs: number;
  /** photographs that are not: the file had no room, or the server would not have them */
  readonly photographsLeft: number;
};
export type PhoneFileTaken = Taken | { readonly type: "refused"; readonly sentence: string };

/** Sends the events of a phone's file as the phone would have, then its photographs; the same file again changes nothing. */
export function usePhoneFile() {
  return async (file: File): Promise<PhoneFileTaken> => {
    const read = phoneFileSchema.safeParse(parsed(await file.text()));
    if (!read.success) return { type: "refused", sentence: "This is no file that a phone has exported." };
    const { device, deviceName, events, unsaved, photographs = [], photographsLeft = 0 } = read.data;
    let setAside = 0;
    for (const batch of batchesOf(events)) {
      const answer = await sent({ protocol: PROTOCOL, device, holds: batch.length, events: batch });
      if (!answer) return { type: "refused", sentence: "The server did not take all of it. Try again: nothing is doubled." };
      setAside += answer.results.filter(({ outcome }) => outcome === "quarantined").length;
    }
    let arrived = 0;
    for (const { sha256, type, base64 } of photographs) {
      const heard = await sentPhotograph({ sha256, type, bytes: bytesOf(base64) }, browser);
      if (heard.type === "taken") arrived += 1;
    }
    return {
      type: "taken",
      phone: deviceName ?? "phone",
      events: events.length,
      setAside,
      hasUnsaved: unsaved != null,
      photographs: arrived,
      photographsLeft: photographsLeft + photographs.length - arrived,
    };
  };
}

function bytesOf(base64: string): Uint8Array<ArrayBuffer> {
  return Uint8Array.from(atob(base64), (character) => character.charCodeAt(0));
}

async function sent(request: unknown) {
  const response = await fetch("/api/v1/sync", {
    method: "POST",
    headers: { "content-type": "application/json" },
    body: JSON.stringify(request),
  }).catch(() => null);
  const answer = syncAnswerSchema.safeParse(response?.ok ? await response.json().catch(() => null) : null);
  return answer.success ? answer.data : null;
}

function parsed(text: string): unknown {
  try {
    return JSON.parse(text);
  } catch {
    return undefined;
  }
}
