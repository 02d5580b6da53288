import { Refused } from "@/components/ui/refused";

export default function Forbidden() {
  return (
    <main className="mx-auto max-w-page p-4">
      <Refused title="Not for your part">
        Your part in this test, or on this server, does not include this page. An administrator can change that.
      </Refused>
    </main>
  );
}
