import SqliteDatabase from "better-sqlite3";
import { afterEach, beforeEach, expect, test } from "vitest";
import { keepingStatements } from "@/db/server/kept-statements";

let client: SqliteDatabase.Database;
let keeping: SqliteDatabase.Database;
beforeEach(() => {
  client = new SqliteDatabase(":memory:");
  client.exec("create table moves (no integer)");
  keeping = keepingStatements(client);
});
afterEach(() => client.close());

const all = "select no from moves order by no";
const insert = "insert into moves values (?)";

test("a statement is prepared once, and works with other values each time", () => {
  expect(keeping.prepare(insert)).toBe(keeping.prepare(insert));
  for (const no of [1, 2]) keeping.prepare(insert).run(no);
  expect(keeping.prepare(all).all()).toEqual([{ no: 1 }, { no: 2 }]);
});

test("how one asked for its rows does not change what the next one gets", () => {
  keeping.prepare(insert).run(1);
  expect(keeping.prepare(all).raw().all()).toEqual([[1]]);
  expect(keeping.prepare(all).all()).toEqual([{ no: 1 }]);
});

test("while its rows are being read, another one of the same text is prepared", () => {
  for (const no of [1, 2]) keeping.prepare(insert).run(no);
  const pairs = [];
  for (const outer of keeping.prepare(all).iterate()) pairs.push([outer, keeping.prepare(all).get()]);
  expect(pairs).toEqual([
    [{ no: 1 }, { no: 1 }],
    [{ no: 2 }, { no: 1 }],
  ]);
});

test("a table that has changed since is read as it is now", () => {
  keeping.prepare(insert).run(1);
  const wide = "select * from moves";
  expect(keeping.prepare(wide).all()).toEqual([{ no: 1 }]);
  client.exec("alter table moves add column note text");
  expect(keeping.prepare(wide).all()).toEqual([{ no: 1, note: null }]);
});

test("it is a handle like the other: transactions, and what was asked of it before", () => {
  expect(() =>
    keeping.transaction(() => {
      keeping.prepare(insert).run(1);
      throw new Error("undone");
    })(),
  ).toThrow("undone");
  expect(client.prepare(all).all()).toEqual([]);
  for (let i = 0; i < 1200; i++) expect(keeping.prepare(`select ${i} as n`).get()).toEqual({ n: i });
});
