import { Notice } from "@/components/ui/notice";

/** What nobody may forget while the weights are moving. */
export function Cautions() {
  return (
    <Notice tone="caution" title="While the test runs">
      <ul className="list-disc pl-5">
        <li>Never under a moving weight. Everybody clear before an order is given.</li>
        <li>Tanks and void spaces only with a permit and a tested atmosphere. No uncertified phone where gas may be.</li>
        <li>If the ship heels more than predicted or does not come back: stop, bring the weights back.</li>
        <li>
          Results are preliminary until approved by the Administration or the class society; not for loading or sailing decisions. Local
          codes come first.
        </li>
      </ul>
    </Notice>
  );
}
