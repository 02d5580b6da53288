import { LostWords } from "@/components/ui/lost-words";

export default function Forbidden() {
  return (
    <LostWords title="This page is not open to you">
      You are signed in, but have no part in this test that shows it: readers must not see each other’s numbers, and the rest is for those
      who were given a part. Ask the lead or the engineer of the test.
    </LostWords>
  );
}
