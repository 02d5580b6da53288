"use client";

import { useRef, useState } from "react";
import { Button } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { type Imported, useImportRecord } from "./use-import-record";

/** Reads a record file in as a test of its own; what is wrong with the file is said with its place. */
export function ImportRecord() {
  const input = useRef<HTMLInputElement>(null);
  const importRecord = useImportRecord();
  const [answer, setAnswer] = useState<Imported | null>(null);
  const take = async (file: File | undefined) => {
    if (!file) return;
    const imported = await importRecord(file);
    setAnswer(imported);
    if (input.current) input.current.value = "";
    if ("test" in imported) window.location.assign(`/tests/${imported.test}`);
  };
  return (
    <div className="flex max-w-hand flex-col gap-3">
      <input
        ref={input}
        type="file"
        accept="application/json,.json"
        className="sr-only"
        tabIndex={-1}
        aria-label="Record file"
        onChange={(event) => take(event.target.files?.[0])}
      />
      <Button onClick={() => input.current?.click()}>Import a record file</Button>
      {answer && "faults" in answer ? (
        <Notice tone="refused" title="This file was not taken in">
          <ul className="list-disc pl-5">
            {answer.faults.map((fault) => (
              <li key={fault} className="break-words">
                {fault}
              </li>
            ))}
          </ul>
        </Notice>
      ) : null}
    </div>
  );
}
