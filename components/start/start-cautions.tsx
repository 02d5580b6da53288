import { Notice } from "@/components/ui/notice";

/** What holds for everyone who comes aboard. */
export function StartCautions() {
  return (
    <Notice tone="caution" title="Before you begin">
      <ul className="mt-1 flex list-disc flex-col gap-2 pl-5">
        <li>
          Results are preliminary until approved by the Administration or the class society; not for loading or sailing decisions. Local
          codes come first.
        </li>
        <li>Never under a moving weight.</li>
        <li>Tanks and void spaces only with a permit and a tested atmosphere.</li>
        <li>No uncertified phone in a gas-dangerous space. Lifejacket in the boat.</li>
        <li>If the ship heels more than predicted or does not come back: stop, bring the weights back, tell the lead.</li>
      </ul>
    </Notice>
  );
}
