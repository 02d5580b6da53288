import { real, sqliteTable, text } from "drizzle-orm/sqlite-core";
import type { TestRecord } from "@/lib/record/test-record";

/** A vessel as the office keeps her. A test takes its own copy: what is changed here later changes no test. */
export const vessels = sqliteTable("vessels", {
  id: text("id").primaryKey(),
  name: text("name").notNull(),
  hullNumber: text("hull_number"),
  lbp: real("lbp").notNull(),
  breadth: real("breadth").notNull(),
  depth: real("depth").notNull(),
  hydrostatics: text("hydrostatics", { mode: "json" }).$type<TestRecord["hydrostatics"]>().notNull(),
  draftMarks: text("draft_marks", { mode: "json" }).$type<TestRecord["draftMarks"]>().notNull(),
  freeboardMarks: text("freeboard_marks", { mode: "json" }).$type<NonNullable<TestRecord["freeboardMarks"]>>().notNull(),
  tanks: text("tanks", { mode: "json" }).$type<TestRecord["tanks"]>().notNull(),
  previous: text("previous", { mode: "json" }).$type<TestRecord["previous"]>(),
  createdAt: text("created_at").notNull(),
  changedAt: text("changed_at").notNull(),
});
