"use client";

import Link from "next/link";
import { usePathname } from "next/navigation";
import { BobSign } from "@/components/ui/bob-sign";
import { useQuery } from "../task/use-query";

/** Back to the readings due of the same test; on that page, the house's own sign. */
export function HomeLink() {
  const query = useQuery();
  const isHome = usePathname() === "/readings";
  if (!query) return <span className="h-11 w-11 shrink-0" />;
  const test = query.get("test");
  if (isHome && !test) return <BobSign className="m-1.5 h-8 w-8 shrink-0" />;
  return (
    <Link
      href={isHome || !test ? "/readings" : `/readings?test=${test}`}
      aria-label="Back to the readings due"
      className="grid h-11 w-11 shrink-0 place-items-center rounded"
    >
      <svg viewBox="0 0 24 24" className="h-7 w-7" aria-hidden="true">
        <path d="M15 4L7 12l8 8" fill="none" stroke="currentColor" strokeWidth="3" strokeLinecap="round" strokeLinejoin="round" />
      </svg>
    </Link>
  );
}
