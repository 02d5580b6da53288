"use client";

import { useQuery } from "../task/use-query";
import { NoTests } from "./no-tests";
import { TestBoard } from "./test-board";
import { TestList } from "./test-list";
import { useTests } from "./use-tests";

/** The first page below deck: the tests on this phone, and what is due of the one picked. */
export function DueBoard() {
  const tests = useTests();
  const query = useQuery();
  const picked = query?.get("test");
  if (!tests || !query) return <p className="py-8 text-center text-ink-soft">Opening what this phone holds</p>;
  const here = tests.find(({ sheet }) => sheet.test.id === picked) ?? (tests.length === 1 ? tests[0] : undefined);
  if (here) return <TestBoard here={here} />;
  return tests.length === 0 ? <NoTests /> : <TestList tests={tests} />;
}
