import { Sign } from "@/components/ui/sign";
import type { Check } from "./self-test";

/** The self-test, in words. */
export function SelfTestList({ checks }: { checks: readonly Check[] | null }) {
  if (!checks) return <p className="min-h-40 text-ink-soft">Trying what this phone can do</p>;
  return (
    <ul className="flex flex-col gap-1.5" aria-label="Self-test of this phone">
      {checks.map(({ name, passed, words }) => (
        <li key={name} className={`flex gap-2 ${passed ? "" : "rounded border-redlead border-l-4 bg-redlead-wash px-2 py-1"}`}>
          <Sign kind={passed ? "read" : "alert"} className="mt-1 h-4 w-4" />
          <p>
            <b>{name}.</b> <span className={passed ? "text-ink-soft" : ""}>{words}</span>
          </p>
        </li>
      ))}
    </ul>
  );
}
