import { refusalSentence } from "@/lib/report/refusal-sentence";
import type { Refusal } from "@/lib/result";

/** What keeps an answer from being given, a sentence each. */
export function RefusalSentences({ refusals }: { refusals: readonly Refusal[] }) {
  const sentences = [...new Set(refusals.map((refusal) => refusalSentence(refusal)))];
  return (
    <ul className="list-disc pl-5">
      {sentences.map((sentence) => (
        <li key={sentence} className="break-words">
          {sentence}
        </li>
      ))}
    </ul>
  );
}
