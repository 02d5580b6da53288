import { sqliteTable, text } from "drizzle-orm/sqlite-core";
import type { TestRecord } from "@/lib/record/test-record";
import type { TestState } from "@/lib/sync/job-sheet";
import { vessels } from "./vessels";

/** The vessel as she was when the test was made: particulars, hydrostatics, marks and tanks. */
export type VesselCopy = Pick<TestRecord, "vessel" | "hydrostatics" | "draftMarks" | "freeboardMarks" | "tanks" | "previous">;

/** Which server goes on with the test: a copy that was handed over is only read. */
export type Custody = "here" | "handed-over";

export const tests = sqliteTable("tests", {
  id: text("id").primaryKey(),
  title: text("title").notNull(),
  date: text("date").notNull(),
  place: text("place").notNull(),
  note: text("note"),
  timeZone: text("time_zone").notNull(),
  state: text("state").$type<TestState>().notNull(),
  custody: text("custody").$type<Custody>().notNull().default("here"),
  vessel: text("vessel")
    .notNull()
    .references(() => vessels.id),
  vesselCopy: text("vessel_copy", { mode: "json" }).$type<VesselCopy>().notNull(),
  createdAt: text("created_at").notNull(),
});
