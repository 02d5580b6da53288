import Link from "next/link";
import { Sign } from "@/components/ui/sign";
import type { Slot } from "@/lib/sync/slot";
import { slotHref } from "../task/slot-query";

type SlotLinkProps = { test: string; slot: Slot; name: string; read: boolean; className?: string };

/** One reading due: a key that says whether this phone has read it. */
export function SlotLink({ test, slot, name, read, className = "" }: SlotLinkProps) {
  const look = read ? "border-ink-line bg-sailcloth-sunken text-ink-soft" : "border-ink bg-sailcloth-raised text-ink";
  return (
    <Link
      href={slotHref(test, slot)}
      prefetch={false}
      className={`flex min-h-key items-center justify-between gap-2 rounded border-2 px-3 font-bold ${look} ${className}`}
    >
      <span className="min-w-0 leading-tight">{name}</span>
      <Sign kind={read ? "read" : "due"} className="h-4 w-4" />
      <span className="sr-only">{read ? "read with this phone" : "not read with this phone"}</span>
    </Link>
  );
}
