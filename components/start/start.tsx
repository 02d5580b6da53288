import Link from "next/link";
import { buttonClass } from "@/components/ui/button";
import { PageTitle } from "@/components/ui/page-title";
import { StartBatten } from "./start-batten";
import { StartCautions } from "./start-cautions";

/** The job in a few words, and the doors that lead to it. */
export function Start() {
  return (
    <main id="main" className="mx-auto max-w-page px-4 py-8">
      <PageTitle title="From batten to lightship" over="An inclining test, reading by reading" />
      <div className="grid items-start gap-8 lg:grid-cols-[3fr_2fr]">
        <div className="flex flex-col gap-6">
          <p className="max-w-prose text-large">
            Known weights are shifted across the deck; pendulums below show the heel on their battens; draft marks, tanks and water tell
            what floats. Battenbook takes the readings where there is no signal, shows in the wheelhouse whether the line is straight, and
            gives the office a lightship that can be defended, reading by reading.
          </p>
          <StartBatten />
          <nav aria-label="Start" className="grid gap-3 sm:grid-cols-2">
            {doors.map(({ href, title, who, weight }) => (
              <Link key={href} href={href} prefetch={false} className={`${buttonClass(weight)} min-h-key flex-col !items-start !gap-0`}>
                <span className="font-bold">{title}</span>
                <span className="font-normal text-small">{who}</span>
              </Link>
            ))}
          </nav>
        </div>
        <StartCautions />
      </div>
    </main>
  );
}

const doors = [
  { href: "/sign-in", title: "Sign in", who: "Lead, engineer, witness", weight: "now" },
  { href: "/join", title: "Join with a code", who: "A phone for the readings", weight: "plain" },
  { href: "/tests", title: "Tests", who: "Control, lightship, records", weight: "plain" },
  { href: "/readings", title: "Readings", who: "On an enrolled phone, without signal", weight: "plain" },
] as const;
