"use client";

import type { Role } from "@/lib/sync/job-sheet";
import type { LiveSnapshot } from "@/lib/sync/live";
import { ControlBoard } from "./control-board";
import { LedControl } from "./led-control";
import { LinkState } from "./link-state";
import { useLiveTest } from "./use-live-test";

export type ControlProps = {
  test: string;
  person: { readonly id: string; readonly name: string };
  roles: readonly Role[];
  first: LiveSnapshot;
};

/** Central control, for those who order and for those who only watch. */
export function Control(props: ControlProps) {
  const orders = props.roles.includes("lead") || props.roles.includes("engineer");
  return orders ? <LedControl {...props} /> : <WatchedControl {...props} />;
}

function WatchedControl({ test, first }: ControlProps) {
  const { snapshot, link } = useLiveTest(test, first);
  return (
    <ControlBoard snapshot={snapshot} acts={null} orders={null} link={<LinkState link={link} unsent={0} />} enrol={null} stopPhone={null} />
  );
}
