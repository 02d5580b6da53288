"use client";

import { useState } from "react";
import { ConfirmButton } from "@/components/ui/confirm-button";
import { Cell, ColumnHead, DataTable, RowHead } from "@/components/ui/data-table";
import { Notice } from "@/components/ui/notice";
import { Panel } from "@/components/ui/panel";
import { Sign } from "@/components/ui/sign";
import type { Phone } from "@/lib/sync/live";
import { heardInWords, phoneInWords } from "./phone-in-words";
import { useMinute } from "./use-minute";
import type { StopPhone } from "./use-stop-phone";

/** The phones of the test: whose they are, when last heard, and what they still hold. */
export function Phones({ phones, onStop }: { phones: readonly Phone[]; onStop: StopPhone | null }) {
  const now = useMinute();
  const [refused, setRefused] = useState<string | null>(null);
  const stop = onStop === null ? null : async (device: string) => setRefused(await onStop(device));
  if (phones.length === 0) {
    return (
      <Panel title="Phones">
        <p>No phone is enrolled yet. Make a code below for each reader.</p>
      </Panel>
    );
  }
  return (
    <Panel title="Phones" aside={heldInWords(phones)}>
      {refused ? <Notice tone="refused">{refused}</Notice> : null}
      <DataTable caption="Phones of this test" className="min-w-[34rem]">
        <thead>
          <tr>
            <ColumnHead>Phone</ColumnHead>
            <ColumnHead>Person</ColumnHead>
            <ColumnHead>Last heard</ColumnHead>
            <ColumnHead figure>Still holds</ColumnHead>
            <ColumnHead>Readings</ColumnHead>
            {stop ? <ColumnHead>Lost?</ColumnHead> : null}
          </tr>
        </thead>
        <tbody>
          {phones.map((phone) => (
            <PhoneRow key={phone.device} phone={phone} now={now} onStop={stop} />
          ))}
        </tbody>
      </DataTable>
    </Panel>
  );
}

type PhoneRowProps = { phone: Phone; now: number | null; onStop: ((device: string) => void) | null };

function PhoneRow({ phone, now, onStop }: PhoneRowProps) {
  return (
    <tr>
      <RowHead>{phone.name}</RowHead>
      <Cell>
        {phone.person}
        <span className="block text-ink-soft text-small">{phone.revoked ? "stopped" : phone.roles.join(", ")}</span>
      </Cell>
      <Cell>{now === null ? "" : heardInWords(phone.lastHeardAt, now)}</Cell>
      <Cell figure>{phone.holds}</Cell>
      <Cell className={phone.missing.length > 0 ? "font-bold text-redlead-text" : ""}>
        <span className="inline-flex items-center gap-2">
          <Sign kind={phone.missing.length > 0 ? "alert" : "read"} />
          {phoneInWords(phone)}
        </span>
      </Cell>
      {onStop ? (
        <Cell>
          {phone.revoked ? null : (
            <ConfirmButton
              question="What it has sent stands; what it still sends is set aside until you let it in."
              yes="Stop this phone"
              onConfirm={() => onStop(phone.device)}
            >
              Stop
            </ConfirmButton>
          )}
        </Cell>
      ) : null}
    </tr>
  );
}

function heldInWords(phones: readonly Phone[]): string {
  const held = phones.reduce((sum, phone) => sum + phone.holds, 0);
  return held === 0 ? "None says it still holds readings" : `${held} readings still on phones`;
}
