import { BobSign } from "./bob-sign";

/** The name with its sign: a bob on its line before the batten. */
export function Wordmark({ className = "" }: { className?: string }) {
  return (
    <span className={`inline-flex items-center gap-2 font-bold tracking-tight ${className}`}>
      <BobSign />
      Battenbook
    </span>
  );
}
