import { Sign } from "@/components/ui/sign";
import type { LiveLink } from "./use-live-test";

/** Whether what stands here is what the server knows, and what this device still has to send. */
export function LinkState({ link, unsent }: { link: LiveLink; unsent: number }) {
  return (
    <output className="flex flex-wrap items-center gap-x-4 gap-y-1 text-small">
      <span className={`inline-flex items-center gap-2 ${link === "away" ? "font-bold text-redlead-text" : "text-ink-soft"}`}>
        <Sign kind={link === "live" ? "read" : link === "away" ? "alert" : "waiting"} />
        {linkInWords[link]}
      </span>
      {unsent > 0 ? (
        <span className="inline-flex items-center gap-2 font-bold">
          <Sign kind="due" />
          {unsent} saved on this device, not sent yet
        </span>
      ) : null}
    </output>
  );
}

const linkInWords: Record<LiveLink, string> = {
  connecting: "Asking the server",
  live: "Live from the server",
  away: "The server does not answer: this is what was last heard. Orders and values are saved here and go when it is back.",
};
