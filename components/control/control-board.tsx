"use client";

import { type ReactNode, useMemo } from "react";
import { testSoFar } from "@/lib/inclining/test-so-far";
import type { LiveSnapshot } from "@/lib/sync/live";
import { Cautions } from "./cautions";
import { Decisions } from "./decisions";
import type { LeadActs } from "./lead-acts";
import { LinePanel } from "./line-panel";
import { MoveOrders } from "./move-orders";
import { MoveSignal } from "./move-signal";
import { MoveWork } from "./move-work";
import { movesNotMeasured } from "./moves-not-measured";
import { Phones } from "./phones";
import { ReadingsGrid } from "./readings-grid";
import { RoundProgress } from "./round-progress";
import { StandingResult } from "./standing-result";
import { StopSign } from "./stop-sign";
import type { StopPhone } from "./use-stop-phone";

type ControlBoardProps = {
  snapshot: LiveSnapshot;
  acts: LeadActs | null /** what stands in the place of orders while none can be given */;
  orders: ReactNode;
  link: ReactNode;
  enrol: ReactNode;
  /** null for whoever only watches */
  stopPhone: StopPhone | null;
};

/** Central control: the move and what needs deciding on top, the readings and the line below, the rest quiet. */
export function ControlBoard({ snapshot, acts, orders, link, enrol, stopPhone }: ControlBoardProps) {
  const so = useMemo(() => testSoFar(snapshot.record), [snapshot.record]);
  return (
    <div className="flex flex-col gap-5">
      <section aria-label="The test now" className="flex flex-col gap-3 border-ink border-y-2 py-4">
        <div className="flex flex-wrap items-center justify-between gap-x-8 gap-y-3">
          <MoveSignal snapshot={snapshot} />
          {acts ? (
            <MoveOrders snapshot={snapshot} acts={acts} />
          ) : (
            (orders ?? <p className="text-ink-soft">You watch; the lead gives the orders.</p>)
          )}
        </div>
        {link}
      </section>
      <StopSign so={so} />
      <Decisions snapshot={snapshot} acts={acts} />
      <div className="grid items-start gap-5 lg:grid-cols-2">
        <ReadingsGrid snapshot={snapshot} />
        <div className="flex min-w-0 flex-col gap-5">
          <LinePanel record={snapshot.record} so={so} />
          <StandingResult record={snapshot.record} so={so} moves={snapshot.moves} unmeasured={movesNotMeasured(snapshot.due, so)} />
        </div>
      </div>
      {acts ? (
        <div className="grid items-start gap-5 lg:grid-cols-3">
          <MoveWork snapshot={snapshot} acts={acts} />
        </div>
      ) : null}
      <div className="grid items-start gap-5 lg:grid-cols-2">
        <div className="flex min-w-0 flex-col gap-5">
          <RoundProgress due={snapshot.due} />
          <Cautions />
        </div>
        <div className="flex min-w-0 flex-col gap-5">
          <Phones phones={snapshot.phones} onStop={stopPhone} />
          {enrol}
        </div>
      </div>
    </div>
  );
}
