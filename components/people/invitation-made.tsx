import { TimeOfDay } from "@/components/ui/time-of-day";
import type { Invitation } from "./use-people";

const ways: Record<Invitation["mail"], string> = {
  sent: "It went out by mail. Where no mail arrives, hand on this link yourself:",
  kept: "No mail server is set, so no mail went out. Hand on this link yourself:",
  refused: "The mail server refused the mail. Hand on this link yourself:",
};

/** The link by which its person sets a password, and how it went out. It is shown once. */
export function InvitationMade({ invitation, name }: { invitation: Invitation; name: string }) {
  return (
    <section aria-label={`Link for ${name}`} className="rounded border-2 border-ink px-4 py-3">
      <p className="font-bold">A link for {name}</p>
      <p className="text-small">{ways[invitation.mail]}</p>
      <p className="my-2 break-all font-mono text-small">{invitation.link}</p>
      <p className="text-ink-soft text-small">
        It works once, until <TimeOfDay at={invitation.expiresAt} dated />. It is not shown again.
      </p>
    </section>
  );
}
