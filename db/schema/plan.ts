import { integer, primaryKey, real, sqliteTable, text } from "drizzle-orm/sqlite-core";
import type { TestRecord } from "@/lib/record/test-record";
import { tests } from "./tests";

type Station = TestRecord["stations"][number];
type Hydrometer = NonNullable<TestRecord["hydrometers"]>[number];
type Aboard = TestRecord["aboard"][number];
type Item = TestRecord["items"][number];

/** Every row of a plan belongs to one test and keeps its place in the list. */
function ofTest() {
  return {
    test: text("test")
      .notNull()
      .references(() => tests.id),
    place: integer("place_in_list").notNull(),
  };
}

export const planStations = sqliteTable(
  "plan_stations",
  {
    ...ofTest(),
    id: text("id").notNull(),
    instrument: text("instrument").$type<Station["instrument"]>().notNull(),
    x: real("x"),
    reversed: integer("reversed", { mode: "boolean" }),
    /** length of the pendulum or span of the U-tube [m] */
    measure: real("measure"),
    /** where it hangs, in words for the reader */
    where: text("where_in_words"),
    scaleFrom: real("scale_from"),
    scaleTo: real("scale_to"),
  },
  (table) => [primaryKey({ columns: [table.test, table.id] })],
);

export const planSeries = sqliteTable(
  "plan_series",
  { ...ofTest(), station: text("station").notNull(), no: integer("no").notNull(), measure: real("measure") },
  (table) => [primaryKey({ columns: [table.test, table.station, table.no] })],
);

export const planWeights = sqliteTable(
  "plan_weights",
  { ...ofTest(), id: text("id").notNull(), mass: real("mass").notNull(), certificate: text("certificate") },
  (table) => [primaryKey({ columns: [table.test, table.id] })],
);

export const planMoves = sqliteTable(
  "plan_moves",
  {
    ...ofTest(),
    no: integer("no").notNull(),
    session: integer("session"),
    label: text("label"),
    positions: text("positions", { mode: "json" }).$type<TestRecord["moves"][number]["positions"]>().notNull(),
  },
  (table) => [primaryKey({ columns: [table.test, table.no] })],
);

export const planWaterPlaces = sqliteTable(
  "plan_water_places",
  { ...ofTest(), where: text("where_in_words").notNull(), depth: real("depth").notNull() },
  (table) => [primaryKey({ columns: [table.test, table.where, table.depth] })],
);

export const planHydrometers = sqliteTable(
  "plan_hydrometers",
  {
    ...ofTest(),
    id: text("id").notNull(),
    scale: text("scale").$type<Hydrometer["scale"]>().notNull(),
    correction: real("correction"),
    certificate: text("certificate"),
  },
  (table) => [primaryKey({ columns: [table.test, table.id] })],
);

const weighed = {
  label: text("label").notNull(),
  mass: real("mass").notNull(),
  x: real("x").notNull(),
  y: real("y").notNull(),
  z: real("z").notNull(),
};

export const planAboard = sqliteTable(
  "plan_aboard",
  { ...ofTest(), ...weighed, during: text("during").$type<NonNullable<Aboard["during"]>>() },
  (table) => [primaryKey({ columns: [table.test, table.place] })],
);

export const planItems = sqliteTable(
  "plan_items",
  {
    ...ofTest(),
    ...weighed,
    action: text("action").$type<Item["action"]>().notNull(),
    toX: real("to_x"),
    toY: real("to_y"),
    toZ: real("to_z"),
  },
  (table) => [primaryKey({ columns: [table.test, table.place] })],
);

/** What a plan has once: method and agreement limits, uncertainties, and the words for the readers' sheet. */
export const planSettings = sqliteTable("plan_settings", {
  test: text("test")
    .primaryKey()
    .references(() => tests.id),
  settings: text("settings", { mode: "json" }).$type<TestRecord["settings"]>(),
  uncertainty: text("uncertainty", { mode: "json" }).$type<TestRecord["uncertainty"]>(),
  rounds: text("rounds", { mode: "json" }).$type<("before" | "after")[]>().notNull(),
  markPlaces: text("mark_places", { mode: "json" }).$type<Record<string, string>>().notNull(),
  /** tanks whose sounding pipe stands in a gas-dangerous space; null: judged from the contents */
  gasDangerous: text("gas_dangerous", { mode: "json" }).$type<string[]>(),
});
