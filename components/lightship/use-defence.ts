import { useEffect, useState } from "react";
import type { Defence } from "@/lib/lightship/defended-lightship";
import type { TestRecord } from "@/lib/record/test-record";
import type { AnalysisAnswer } from "@/worker/analysis-messages";

export type DefenceState =
  | { readonly type: "drawing"; readonly share: number }
  | { readonly type: "done"; readonly defence: Defence }
  | { readonly type: "stopped" };

/** The intervals of a record's lightship, worked out off the main thread; `stop` ends the sums, `start` begins anew. */
export function useDefence(record: TestRecord): DefenceState & { readonly stop: () => void; readonly start: () => void } {
  const [state, setState] = useState<DefenceState>({ type: "drawing", share: 0 });
  const [run, setRun] = useState(1);
  useEffect(() => {
    if (run === 0) return;
    if (typeof Worker === "undefined") return setState({ type: "stopped" });
    const worker = new Worker(new URL("../../worker/analysis.worker.ts", import.meta.url), { type: "module" });
    worker.addEventListener("message", ({ data }: MessageEvent<AnalysisAnswer>) =>
      setState(data.type === "progress" ? drawing(data.share) : ended(data)),
    );
    worker.addEventListener("error", () => setState({ type: "stopped" }));
    worker.postMessage({ record });
    return () => worker.terminate();
  }, [record, run]);
  return {
    ...state,
    stop: () => {
      setRun(0);
      setState({ type: "stopped" });
    },
    start: () => {
      setState(drawing(0));
      setRun((before) => before + 1);
    },
  };
}

function drawing(share: number): DefenceState {
  return { type: "drawing", share };
}

function ended(answer: Exclude<AnalysisAnswer, { type: "progress" }>): DefenceState {
  return answer.type === "done" ? { type: "done", defence: answer.defence } : { type: "stopped" };
}
