import { defendedInStretches, usualDraws } from "@/lib/lightship/defended-lightship";
import type { AnalysisAnswer, AnalysisQuestion } from "./analysis-messages";

// ended by the page that asked when its answer is no longer wanted
addEventListener("message", ({ data }: MessageEvent<AnalysisQuestion>) => {
  const draws = data.record.settings?.draws ?? usualDraws;
  const stretches = defendedInStretches(data.record);
  for (;;) {
    const step = stretches.next();
    if (step.done) return tell(step.value.ok ? { type: "done", defence: step.value.value } : { type: "refused" });
    tell({ type: "progress", share: step.value / draws });
  }
});

function tell(answer: AnalysisAnswer): void {
  postMessage(answer);
}
