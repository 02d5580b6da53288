import { afterEach, beforeEach, expect, test } from "vitest";
import { identityOf } from "@/db/server/server-identity";
import type { Slot } from "@/lib/sync/slot";
import { cookieOf } from "../app/visitors";
import { Phone } from "../db/server/phone";
import { personWith, yardIn } from "../db/server/yard";
import { FaultPhone, heardIn } from "./fault-phone";
import { FaultServer } from "./fault-server";

const slot = (move: number): Slot => ({ kind: "batten", move, repeat: 1, station: "A", series: 1 });

let server: FaultServer;
let writer: Phone;
let phone: FaultPhone;
let cookie: string;
beforeEach(async () => {
  server = new FaultServer();
  const yard = yardIn(server.db);
  const person = personWith(yard, "reader");
  writer = new Phone(server.db, yard.test, person.id);
  phone = new FaultPhone(writer.device);
  cookie = await cookieOf(person);
});
afterEach(() => server.remove());

const reads = (...moves: number[]) => {
  for (const move of moves) phone.save(writer.reads(slot(move), { mode: "settled", valuesMm: [100 + move] }));
};
const sends = () => phone.sends(async (text) => heardIn(await server.receives(text, cookie)));
const states = () => phone.events.map(({ state }) => state);
const held = () => server.db.$client.prepare("select seq from events order by seq").pluck().all();

test("a phone hears that its events are in a backup", async () => {
  reads(0, 1);
  await sends();
  expect(states()).toEqual(["on-server", "on-server"]);
  await server.backUp();
  reads(2);
  await sends();
  expect(states()).toEqual(["confirmed", "confirmed", "on-server"]);
});

test("a phone sends again what the restored server has lost, once, and nothing that it still has", async () => {
  reads(0, 1);
  await sends();
  await server.backUp();
  reads(2, 3);
  await sends();
  const before = identityOf(server.db);
  await server.restore();
  expect(held()).toEqual([1, 2]);
  expect(identityOf(server.db)).toEqual({ id: before.id, epoch: expect.not.stringContaining(before.epoch) });
  // the first answer tells what is missing, the next request brings it
  await sends();
  expect(states()).toEqual(["confirmed", "confirmed", "saved", "saved"]);
  await sends();
  expect(held()).toEqual([1, 2, 3, 4]);
  await server.backUp();
  await sends();
  expect(states()).toEqual(new Array(4).fill("confirmed"));
  expect(held()).toEqual([1, 2, 3, 4]);
});

test("what was confirmed is sent again all the same where an older copy than the last was put in place", async () => {
  reads(0);
  await sends();
  await server.backUp();
  const older = server.lastCopy;
  reads(1);
  await sends();
  await server.backUp();
  await sends();
  expect(states()).toEqual(["confirmed", "confirmed"]);
  await server.restore(older);
  await sends();
  await sends();
  expect(held()).toEqual([1, 2]);
});

test("a full disk of the server is answered 507, and the phone keeps everything", async () => {
  reads(...Array.from({ length: 40 }, (_, i) => i % 8));
  const full = Number(server.db.$client.pragma("page_count", { simple: true }));
  server.db.$client.pragma(`max_page_count = ${full}`);
  let refused: Response | null = null;
  await phone.sends(async (text) => {
    refused = await server.receives(text, cookie);
    return heardIn(refused);
  });
  expect(refused).toMatchObject({ status: 507 });
  expect(states()).toEqual(new Array(40).fill("saved"));
  server.db.$client.pragma("max_page_count = 1073741823");
  await sends();
  expect(states()).toEqual(new Array(40).fill("on-server"));
});
