import { Quantity } from "@/components/ui/quantity";
import type { TestSoFar } from "@/lib/inclining/test-so-far";
import { heeledTooFar, mostHeelDegrees } from "./heel-stop";

/** In large type, when the ship heels more than a test may take her. */
export function StopSign({ so }: { so: TestSoFar }) {
  const tooFar = so.line ? heeledTooFar(so.line.moves) : [];
  const worst = tooFar.at(-1);
  if (!worst) return null;
  return (
    <div role="alert" className="rounded border-4 border-redlead bg-redlead-wash px-5 py-4">
      <p className="font-bold text-signal">Stop</p>
      <p className="text-large">
        At move {worst.no} she heeled <Quantity value={(Math.atan(worst.tanHeel) * 180) / Math.PI} unit="°" decimals={1} signed />, more
        than {mostHeelDegrees}°. Bring the weights back; find out why before any further move.
      </p>
    </div>
  );
}
