import { expect, test } from "vitest";
import { tellEnding } from "@/db/server/ending";
import { liveStream } from "@/db/server/live-stream";
import { Phone } from "./phone";
import { personWith, yard } from "./yard";

const whoever = async () => true;

test("a live line ends with the listener's right to see it", async () => {
  const ship = yard();
  let may = true;
  const lines = liveStream(ship.db, ship.test, async () => may, new AbortController().signal).getReader();
  await told(lines);
  may = false;
  const mara = new Phone(ship.db, ship.test, personWith(ship, "reader", "Mara").id);
  mara.sends([mara.reads({ kind: "draft", mark: "AP", round: "before" }, { value: 3.381 })]);
  expect((await lines.read()).done).toBe(true);
});

test("a live line tells what stands, then each change, and closes at once when the server is asked to end, as every later one", async () => {
  const ship = yard();
  const mara = new Phone(ship.db, ship.test, personWith(ship, "reader", "Mara").id);
  const lines = liveStream(ship.db, ship.test, whoever, new AbortController().signal).getReader();
  expect(await told(lines)).toContain("event: snapshot");
  mara.sends([mara.reads({ kind: "draft", mark: "AP", round: "before" }, { value: 3.381 })]);
  expect(await told(lines)).toContain("3.381");
  const closed = lines.read();
  tellEnding();
  expect((await closed).done).toBe(true);
  const late = liveStream(ship.db, ship.test, whoever, new AbortController().signal).getReader();
  expect((await late.read()).done).toBe(true);
});

async function told(lines: ReadableStreamDefaultReader<Uint8Array>): Promise<string> {
  return new TextDecoder().decode((await lines.read()).value);
}
