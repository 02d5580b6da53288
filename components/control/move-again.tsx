"use client";

import { useState } from "react";
import { ChoiceField } from "@/components/ui/choice-field";
import { ConfirmButton } from "@/components/ui/confirm-button";
import { TextField } from "@/components/ui/text-field";
import type { MoveProgress } from "@/lib/sync/live";
import type { LeadActs } from "./lead-acts";

/** Orders a closed move again, or takes it out of the line; both leave their trace. */
export function MoveAgain({ moves, acts }: { moves: readonly MoveProgress[]; acts: LeadActs }) {
  const [no, setNo] = useState(moves.at(-1)?.no ?? 0);
  const [reason, setReason] = useState("");
  const move = moves.find((each) => each.no === no) ?? moves[0];
  if (!move) return null;
  return (
    <div className="flex max-w-hand flex-col gap-3">
      <ChoiceField id="again-move" label="Move" value={move.no} onChange={(event) => setNo(Number(event.target.value))}>
        {moves.map((each) => (
          <option key={each.no} value={each.no}>
            Move {each.no}
            {each.repeat > 1 ? `, repeat ${each.repeat}` : ""}
          </option>
        ))}
      </ChoiceField>
      <ConfirmButton
        question={`Move ${move.no} is read again as repeat ${move.repeat + 1}; the earlier readings stay, but no longer count.`}
        yes={`Order repeat ${move.repeat + 1}`}
        onConfirm={() => acts.repeatMove({ no: move.no, repeat: move.repeat + 1 })}
      >
        Repeat move {move.no}
      </ConfirmButton>
      <TextField
        id="exclude-reason"
        label="Why it is to be excluded"
        value={reason}
        onChange={(event) => setReason(event.target.value)}
        hint="Written into the ledger"
      />
      <ConfirmButton
        question={`Move ${move.no} takes no part in the line any more.`}
        yes={`Exclude move ${move.no}`}
        disabled={reason.trim() === ""}
        onConfirm={() => acts.excludeMove(move, reason.trim())}
      >
        Exclude move {move.no}
      </ConfirmButton>
    </div>
  );
}
