import Link from "next/link";
import { Notice } from "@/components/ui/notice";
import { PageTitle } from "@/components/ui/page-title";
import { TimeOfDay } from "@/components/ui/time-of-day";

type KeptMail = {
  readonly id: string;
  readonly at: string;
  readonly to: string;
  readonly subject: string;
  readonly text: string;
  readonly attachments: readonly string[];
};

/** What would have gone out by mail, where no mail server is set. */
export function KeptMailPage({ mails }: { mails: readonly KeptMail[] }) {
  return (
    <>
      <PageTitle title="Mail kept here" over={<Link href="/people">People</Link>} />
      {mails.length === 0 ? (
        <Notice title="None">
          Where no mail server is set, every mail is kept here instead of going out, so that its link can be handed on.
        </Notice>
      ) : null}
      <ol className="flex max-w-hand flex-col gap-4">
        {mails.map(({ id, at, to, subject, text, attachments }) => (
          <li key={id} className="rounded border border-ink-line bg-sailcloth-raised px-4 py-3">
            <h2 className="font-bold">{subject}</h2>
            <p className="text-ink-soft text-small">
              To {to}, <TimeOfDay at={at} dated />
            </p>
            <pre className="mt-2 whitespace-pre-wrap break-words font-sans">{text}</pre>
            {attachments.length > 0 ? <p className="text-small">With {attachments.join(", ")}</p> : null}
          </li>
        ))}
      </ol>
    </>
  );
}
