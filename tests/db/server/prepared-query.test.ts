import { eq, sql } from "drizzle-orm";
import { integer, sqliteTable, text } from "drizzle-orm/sqlite-core";
import { expect, test } from "vitest";
import { ledgerEntries } from "@/db/schema/ledger";
import { type Database, openDatabase } from "@/db/server/connection";
import { preparedInsert, preparedQuery } from "@/db/server/prepared-query";

const moves = sqliteTable("moves", {
  no: integer("no").primaryKey(),
  note: text("note"),
  places: text("places", { mode: "json" }).$type<readonly number[]>().notNull(),
  isMeasured: integer("is_measured", { mode: "boolean" }).notNull(),
});
const insertMove = preparedInsert(moves);
const moveOf = preparedQuery((db) =>
  db
    .select()
    .from(moves)
    .where(eq(moves.no, sql.placeholder("no")))
    .prepare(),
);

function withMoves(): Database {
  const db = openDatabase(":memory:");
  db.$client.exec("create table moves (no integer primary key, note text, places text not null, is_measured integer not null)");
  return db;
}

test("is built once for each database and asked with other values each time", () => {
  const [ours, theirs] = [withMoves(), withMoves()];
  const move = { no: 1, note: null, places: [4.2, -4.2], isMeasured: true };
  insertMove(ours, move);
  insertMove(ours, { ...move, no: 2, note: "gust", isMeasured: false });
  expect(moveOf(ours).get({ no: 1 })).toEqual(move);
  expect(moveOf(ours).get({ no: 2 })).toMatchObject({ note: "gust", isMeasured: false });
  expect(moveOf(theirs).get({ no: 1 })).toBeUndefined();
  expect(moveOf(ours)).toBe(moveOf(ours));
  expect(ours.$client.prepare("select note is null from moves where no = 1").pluck().get()).toBe(1);
});

test("is not for rows in which JSON may be missing: the word null would stand there", () => {
  expect(() => preparedInsert(ledgerEntries)).toThrow("before may be null and is JSON");
});
