"use client";

import { typedNumber } from "@/components/ui/typed-number";
import { NumberPad } from "../pad/number-pad";
import { typedAfter } from "../pad/typed-keys";
import type { Entry } from "../task/reading-flow";
import { SaveBar } from "../task/save-bar";
import { TypedDigits } from "../task/typed-digits";
import { MarkBoard } from "./mark-board";
import { estimatesOf, type MarkEntry, markSecondLook, markSentence, markValue, meanOf } from "./mark-entry";

type MarkScreenProps = { entry: Entry<MarkEntry>; kind: "draft" | "freeboard" };

/** Several estimates of one waterline; their mean is the reading. */
export function MarkScreen({ entry, kind }: MarkScreenProps) {
  const { form, type } = entry;
  const value = markValue(form, kind);
  const estimates = estimatesOf(form);
  const takeEstimate = () => type({ estimates: [...form.estimates, form.typing], typing: "" });
  const takeOut = (index: number) => type({ ...form, estimates: form.estimates.filter((_, i) => i !== index) });
  return (
    <div className="flex flex-1 flex-col gap-2">
      <MarkBoard estimates={estimates} mean={meanOf(estimates)} kind={kind} />
      <TypedDigits typed={form.typing} unit="m" taken={form.estimates} onDrop={takeOut} />
      <div className="mt-auto flex flex-col gap-1.5">
        <NumberPad
          signed={kind === "freeboard"}
          onKey={(key) => type({ ...form, typing: typedAfter(form.typing, key) })}
          next={{ label: "Next estimate", enabled: typedNumber(form.typing) !== null, onNext: takeEstimate }}
        />
        <SaveBar
          refusal={value.ok ? null : markSentence(value.refusal)}
          ready={value.ok}
          secondLook={value.ok ? markSecondLook(form) : null}
          saving={entry.saving}
          label={entry.correcting ? "Save correction" : "Save"}
          onSave={() => value.ok && entry.save(value.value)}
        />
      </div>
    </div>
  );
}
