"use client";

import Link from "next/link";
import type { ReactNode } from "react";
import { buttonClass } from "@/components/ui/button";
import { Notice } from "@/components/ui/notice";
import { type Task, taskNames } from "./cautions";
import { CautionsGate } from "./cautions-gate";
import { type SheetHere, useJobSheet } from "./use-job-sheet";
import { useQuery } from "./use-query";

type SheetGateProps = { task: Task; children: (here: SheetHere, query: URLSearchParams) => ReactNode };

/** Opens a task once its test is known on this phone and its cautions are confirmed. */
export function SheetGate({ task, children }: SheetGateProps) {
  const query = useQuery();
  const here = useJobSheet(query?.get("test") ?? null);
  if (here === undefined || query === null) return <Looking task={task} />;
  if (here === null) return <NoSheet task={task} />;
  return (
    <CautionsGate task={task} test={here.sheet.test.id} person={here.person.id}>
      {children(here, new URLSearchParams(query))}
    </CautionsGate>
  );
}

function Looking({ task }: { task: Task }) {
  return (
    <>
      <h1 className="font-bold text-title">{taskNames[task]}</h1>
      <p className="py-8 text-center text-ink-soft">Opening the job sheet on this phone</p>
    </>
  );
}

function NoSheet({ task }: { task: Task }) {
  return (
    <div className="flex flex-col gap-4 py-4">
      <h1 className="font-bold text-title">{taskNames[task]}</h1>
      <Notice tone="caution" title="This test is not on this phone">
        Pick one that is, or fetch it where there is signal: enrol the phone with a code from the lead.
      </Notice>
      <Link href="/readings" className={buttonClass("now")}>
        Tests on this phone
      </Link>
      <Link href="/join" className={buttonClass("plain")}>
        Enrol this phone
      </Link>
    </div>
  );
}
