import { QrCode } from "@/components/ui/qr-code";
import { TimeOfDay } from "@/components/ui/time-of-day";

export type MadeCode = {
  readonly code: string;
  readonly expiresAt: string;
  readonly personName: string /** leads to the page to join, under the one name that the server has */;
  readonly url: string;
};

/** A fresh code, to be scanned or typed on the phone; it is shown once. */
export function Enrolment({ made }: { made: MadeCode }) {
  const join = new URL("/join", made.url);
  return (
    <section aria-label={`Code for ${made.personName}`} className="flex flex-wrap items-center gap-6 rounded border-2 border-ink p-4">
      <QrCode text={`${join}#code=${made.code}`} label={`QR code that opens the page to join with the code ${made.code}`} />
      <div>
        <p>For {made.personName}, once, on one phone:</p>
        <p className="whitespace-nowrap font-bold font-mono text-figure sm:text-signal">{made.code}</p>
        <p className="text-small">
          Scan it, or open <strong>{join.href}</strong> on the phone and type the code.
        </p>
        <p className="text-small">
          Good until <TimeOfDay at={made.expiresAt} dated />. It is not shown again.
        </p>
      </div>
    </section>
  );
}
