import { buttonClass } from "@/components/ui/button";
import { Sign } from "@/components/ui/sign";
import type { Enrolment } from "./use-enrolment";

/** What the phone now has, and what it could not get, before it goes below deck. A full load opens the kept pages. */
export function Enrolled({ enrolment: { tests, persisted, signed, pages } }: { enrolment: Enrolment }) {
  return (
    <div className="flex flex-1 flex-col gap-4">
      <h1 className="font-bold text-figure">This phone is enrolled</h1>
      <ul className="flex flex-1 flex-col gap-3 text-large" role="status">
        <Line
          good={tests > 0}
          text={
            tests > 0
              ? `${tests} job sheet${tests === 1 ? "" : "s"} on this phone.`
              : "No job sheet yet: the lead has not planned a test for you."
          }
        />
        <Line
          good={pages}
          text={
            pages
              ? "The pages are kept: no signal is needed from here."
              : "The pages are not kept yet: stay near the server and open this page again."
          }
        />
        <Line
          good={signed}
          text={signed ? "Readings are signed with this phone's own key." : "Readings are marked as unsigned: this browser keeps no keys."}
        />
        <Line
          good={persisted}
          text={
            persisted
              ? "The browser has promised not to clear the readings."
              : "The browser may clear its store when space runs out: send the readings the same day."
          }
        />
      </ul>
      <a href="/readings" className={`${buttonClass("now")} min-h-16 w-full !text-title`}>
        Start reading
      </a>
    </div>
  );
}

function Line({ good, text }: { good: boolean; text: string }) {
  return (
    <li className="flex gap-3">
      <Sign kind={good ? "read" : "alert"} className="mt-1 h-5 w-5" />
      {text}
    </li>
  );
}
