import { index, integer, primaryKey, sqliteTable, text } from "drizzle-orm/sqlite-core";
import type { ReadingValue } from "@/lib/sync/event";
import type { SlotState } from "@/lib/sync/live";
import type { Slot } from "@/lib/sync/slot";
import type { ProjectedReading } from "@/lib/sync/slot-projection";

/** The projection: what stands now. All three tables can be dropped and rebuilt from the events, with the same answer. */

/** Events that take part, and the slot in which they do (an orphan's is the one it was assigned to). */
export const placedEvents = sqliteTable(
  "placed_events",
  {
    event: text("event").primaryKey(),
    serverSeq: integer("server_seq").notNull(),
    test: text("test").notNull(),
    type: text("type").notNull(),
    slotKey: text("slot_key"),
  },
  (table) => [index("placed_slot").on(table.test, table.slotKey), index("placed_type").on(table.test, table.type)],
);

export const slots = sqliteTable(
  "slots",
  {
    test: text("test").notNull(),
    slotKey: text("slot_key").notNull(),
    slot: text("slot", { mode: "json" }).$type<Slot>().notNull(),
    state: text("state").$type<SlotState>().notNull(),
    heads: text("heads", { mode: "json" }).$type<readonly string[]>().notNull(),
  },
  (table) => [primaryKey({ columns: [table.test, table.slotKey] })],
);

export const readings = sqliteTable(
  "readings",
  {
    event: text("event").primaryKey(),
    test: text("test").notNull(),
    slotKey: text("slot_key").notNull(),
    reading: text("reading").notNull(),
    value: text("value", { mode: "json" }).$type<ReadingValue>().notNull(),
    source: text("source").$type<ProjectedReading["source"]>().notNull(),
    status: text("status").$type<ProjectedReading["status"]>().notNull(),
    author: text("author").notNull(),
    device: text("device").notNull(),
    capturedAt: text("captured_at").notNull(),
    clockOffsetMs: integer("clock_offset_ms"),
    receivedAt: text("received_at").notNull(),
    serverSeq: integer("server_seq").notNull(),
    reason: text("reason"),
    corrects: integer("corrects", { mode: "boolean" }).notNull(),
  },
  (table) => [index("readings_slot").on(table.test, table.slotKey)],
);
