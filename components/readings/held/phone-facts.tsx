"use client";

import Link from "next/link";
import { useIdentity } from "./use-identity";

/** Who this phone is, and what it could and could not keep. */
export function PhoneFacts() {
  const identity = useIdentity();
  if (identity === undefined) return null;
  if (identity === null)
    return (
      <p>
        This phone is not enrolled. <Link href="/join">Enrol it with a code</Link>.
      </p>
    );
  const offset = identity.clockOffsetMs === null ? null : Math.round(identity.clockOffsetMs / 1000);
  return (
    <dl className="mt-2 grid grid-cols-[auto_1fr] gap-x-4 gap-y-1 rounded border border-ink-line px-3 py-2 text-small">
      <Fact name="Phone" value={identity.deviceName} />
      <Fact name="Reader" value={identity.person?.name ?? "not known yet"} />
      <Fact name="Signed" value={identity.keys ? "yes, with a key that cannot leave this phone" : "no: this browser keeps no keys"} />
      <Fact name="Storage" value={identity.persisted ? "kept by the browser" : "the browser may clear it when space runs out"} />
      <Fact name="Clock" value={clockWords(offset)} />
      <Fact name="Version" value={process.env.BATTENBOOK_VERSION ?? "not built"} />
    </dl>
  );
}

function Fact({ name, value }: { name: string; value: string }) {
  return (
    <>
      <dt className="text-ink-soft">{name}</dt>
      <dd>{value}</dd>
    </>
  );
}

function clockWords(offsetSeconds: number | null): string {
  if (offsetSeconds === null) return "not compared yet";
  if (Math.abs(offsetSeconds) <= 1) return "with the server's";
  const size = Math.abs(offsetSeconds);
  const words = size > 120 ? `${Math.round(size / 60)} min` : `${size} s`;
  return `${words} ${offsetSeconds > 0 ? "behind" : "ahead of"} the server's`;
}
