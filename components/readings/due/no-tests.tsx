import Link from "next/link";
import { buttonClass } from "@/components/ui/button";

/** A phone that has not been let in yet. */
export function NoTests() {
  return (
    <div className="flex flex-1 flex-col justify-center gap-4 py-6">
      <h1 className="font-bold text-title">No test on this phone yet</h1>
      <p className="text-large">
        The lead gives each reader a code. With it this phone fetches its job sheet once; from then on it needs no signal until the evening.
      </p>
      <Link href="/join" className={`${buttonClass("now")} min-h-16 w-full !text-title`}>
        Enrol this phone
      </Link>
    </div>
  );
}
