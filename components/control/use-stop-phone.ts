"use client";

/** Stops a phone of the test; null when it is stopped, else why not. */
export type StopPhone = (device: string) => Promise<string | null>;

/** A lost phone is stopped on the server and nowhere else: this needs it to answer. */
export function useStopPhone(test: string): StopPhone {
  return async (device) => {
    const answer = await fetch(`/api/v1/tests/${test}/devices/${device}`, { method: "DELETE" }).catch(() => null);
    if (answer === null) return "The server does not answer; the phone was not stopped.";
    return answer.ok ? null : "The server refused to stop the phone.";
  };
}
