import { useRouter } from "next/navigation";
import { useState } from "react";
import type { StatedUncertainty } from "@/lib/lightship/stated-uncertainty";

/** Puts a test's uncertainties on the server and shows the page anew; null where it worked, else a sentence. */
export function useSaveUncertainty(test: string) {
  const router = useRouter();
  const [refused, setRefused] = useState<string | null>(null);
  const save = async (uncertainty: StatedUncertainty | null) => {
    const answer = await fetch(`/api/v1/tests/${test}/uncertainty`, {
      method: "PUT",
      headers: { "content-type": "application/json" },
      body: JSON.stringify(uncertainty),
    }).catch(() => null);
    setRefused(answer === null ? "The server does not answer; nothing was saved." : answer.ok ? null : "The server did not take them.");
    if (answer?.ok) router.refresh();
  };
  return { save, refused };
}
