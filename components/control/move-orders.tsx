"use client";

import { Button } from "@/components/ui/button";
import { ConfirmButton } from "@/components/ui/confirm-button";
import { Disclosure } from "@/components/ui/disclosure";
import type { LiveSnapshot, MoveProgress } from "@/lib/sync/live";
import type { LeadActs } from "./lead-acts";
import { MoveAgain } from "./move-again";
import { moveNow } from "./move-now";

/** The orders a lead gives: close this move, open the next, order one again. */
export function MoveOrders({ snapshot, acts }: { snapshot: LiveSnapshot; acts: LeadActs }) {
  const { kind, move, due } = moveNow(snapshot);
  const again = snapshot.moves.filter((each) => each.state === "closed" || each.state === "disagrees");
  return (
    <div className="flex flex-wrap items-start gap-3">
      {move && kind === "next" ? (
        <Button weight="now" className="min-h-key px-6 text-large" onClick={() => acts.openMove(move)}>
          Open move {move.no}
        </Button>
      ) : null}
      {move && kind === "open" ? <Close move={move} missing={due.length} acts={acts} /> : null}
      {again.length > 0 ? (
        <Disclosure title="Repeat or exclude a move">
          <MoveAgain moves={again} acts={acts} />
        </Disclosure>
      ) : null}
    </div>
  );
}

function Close({ move, missing, acts }: { move: MoveProgress; missing: number; acts: LeadActs }) {
  if (missing === 0) {
    return (
      <Button weight="now" className="min-h-key px-6 text-large" onClick={() => acts.closeMove(move)}>
        Close move {move.no}
      </Button>
    );
  }
  return (
    <ConfirmButton
      question={`${missing === 1 ? "One station has" : `${missing} stations have`} not been received for move ${move.no}.`}
      yes="Close it all the same"
      onConfirm={() => acts.closeMove(move)}
    >
      Close move {move.no}
    </ConfirmButton>
  );
}
