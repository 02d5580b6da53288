"use client";

import { controlClass, Field } from "@/components/ui/field";
import type { Entry } from "../task/reading-flow";
import { SaveBar } from "../task/save-bar";

/** A note in the reader's own words. */
export function NoteScreen({ entry }: { entry: Entry<{ text: string }> }) {
  const { form, type, save, saving, correcting } = entry;
  const text = form.text.trim();
  return (
    <div className="flex flex-1 flex-col gap-3">
      <Field id="note-text" label="Note">
        <textarea
          id="note-text"
          rows={8}
          maxLength={2000}
          value={form.text}
          onChange={(event) => type({ text: event.target.value })}
          className={`${controlClass} py-2`}
        />
      </Field>
      <div className="mt-auto">
        <SaveBar
          refusal={null}
          ready={text !== ""}
          secondLook={null}
          saving={saving}
          label={correcting ? "Save correction" : "Save"}
          onSave={() => save({ text })}
        />
      </div>
    </div>
  );
}
