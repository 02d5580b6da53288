import { useRouter } from "next/navigation";
import { useState } from "react";

/** Puts one part of what a test states on the server and shows the page anew; null where it worked, else a sentence. */
export function useSavePart<T>(test: string, part: "uncertainty" | "settings" | "expected") {
  const router = useRouter();
  const [refused, setRefused] = useState<string | null>(null);
  const save = async (stated: T | null) => {
    const answer = await fetch(`/api/v1/tests/${test}/${part}`, {
      method: "PUT",
      headers: { "content-type": "application/json" },
      body: JSON.stringify(stated),
    }).catch(() => null);
    setRefused(answer === null ? "The server does not answer; nothing was saved." : answer.ok ? null : "The server did not take them.");
    if (answer?.ok) router.refresh();
  };
  return { save, refused };
}
