import { mkdtempSync, readdirSync, readFileSync, rmSync, writeFileSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterEach, beforeEach, describe, expect, test } from "vitest";
import { onChange } from "@/db/server/changes";
import { filesFolder } from "@/db/server/data-folder";
import { liveSnapshot } from "@/db/server/live-snapshot";
import { keepPhotograph, photographFor } from "@/db/server/photographs";
import { grantRole } from "@/db/server/role-grants";
import { PHOTOGRAPH_BYTES } from "@/lib/sync/photograph";
import type { Slot } from "@/lib/sync/slot";
import { Phone } from "./phone";
import { named, picture } from "./pictures";
import { at, personWith, testIn, type Yard, yard } from "./yard";

const slot: Slot = { kind: "batten", move: 1, repeat: 1, station: "A", series: 1 };
const value = { mode: "settled" as const, valuesMm: [101] };
const mark = picture(120);
let folder: string;
let here: Yard;
let reader: string;
let phone: Phone;

beforeEach(() => {
  folder = mkdtempSync(path.join(tmpdir(), "battenbook-"));
  process.env.BATTENBOOK_DATA = folder;
  here = yard();
  reader = personWith(here, "reader", "Rolf Lund").id;
  phone = new Phone(here.db, here.test, reader);
});
afterEach(() => rmSync(folder, { recursive: true }));

function readsWith(...photographs: string[]) {
  const { results } = phone.sends([phone.reads(slot, value, { photographs })]);
  expect(results[0]?.outcome).toBe("applied");
}

const kept = (given = mark) => keepPhotograph(here.db, given.name, given.bytes);

describe("a photograph that an event names", () => {
  test("is kept under its hash, byte for byte, and the second time nothing changes", async () => {
    readsWith(mark.name);
    expect(await kept()).toEqual({ ok: true, value: { isNew: true } });
    expect(await kept()).toEqual({ ok: true, value: { isNew: false } });
    expect(readdirSync(filesFolder())).toEqual([mark.name]);
    expect(readFileSync(path.join(filesFolder(), mark.name))).toEqual(mark.bytes);
  });

  test("is kept once when it comes twice at once, and nothing half is left", async () => {
    readsWith(mark.name);
    await Promise.all([kept(), kept(), kept()]);
    expect(readdirSync(filesFolder())).toEqual([mark.name]);
  });

  test("is taken again where the disk has spoilt it, and never shown spoilt", async () => {
    readsWith(mark.name);
    await kept();
    writeFileSync(path.join(filesFolder(), mark.name), mark.bytes.subarray(0, 40));
    expect(photographFor(here.db, mark.name, reader, at)).toBeNull();
    expect(await kept()).toEqual({ ok: true, value: { isNew: true } });
    expect(photographFor(here.db, mark.name, reader, at)).toMatchObject({ type: "image/png" });
  });

  test("is told to the open pages of its test when it comes", async () => {
    readsWith(mark.name);
    let told = 0;
    const stop = onChange(here.test, () => {
      told += 1;
    });
    await kept();
    await kept();
    stop();
    expect(told).toBe(1);
  });

  test("stands with its value in what the wheelhouse sees, before and after its bytes have come", async () => {
    readsWith(mark.name);
    const standing = () => {
      const due = liveSnapshot(here.db, here.test, at)?.due.find((each) => each.readings.length > 0);
      return due?.readings[0]?.photographs;
    };
    expect(standing()).toEqual([{ sha256: mark.name, hasArrived: false }]);
    await kept();
    expect(standing()).toEqual([{ sha256: mark.name, hasArrived: true }]);
  });
});

describe("what is refused", () => {
  test("is a photograph that no event names", async () => {
    expect(await kept()).toEqual({ ok: false, refusal: { type: "NoEventNamesIt" } });
  });

  test("are bytes other than those that the name says, and bytes cut off on their way", async () => {
    const other = picture(7);
    readsWith(mark.name);
    expect(await keepPhotograph(here.db, mark.name, other.bytes)).toEqual({ ok: false, refusal: { type: "OtherBytes", got: other.name } });
    expect(await keepPhotograph(here.db, mark.name, mark.bytes.subarray(0, 50))).toMatchObject({ refusal: { type: "OtherBytes" } });
    expect(photographFor(here.db, mark.name, reader, at)).toBeNull();
  });

  test("is what is no picture, whatever it calls itself, and what is too large", async () => {
    const page = named(Buffer.from("<html><script>alert(1)</script></html>"));
    const large = named(Buffer.concat([mark.bytes, Buffer.alloc(PHOTOGRAPH_BYTES)]));
    readsWith(page.name, large.name);
    expect(await kept(page)).toEqual({ ok: false, refusal: { type: "NoPicture" } });
    expect(await kept(large)).toMatchObject({ ok: false, refusal: { type: "TooLarge", got: large.bytes.length } });
  });
});

describe("who sees a photograph", () => {
  const sees = (person: string) => photographFor(here.db, mark.name, person, at) !== null;

  test("are its reader, and lead, engineer and witness of its test; another reader and the administrator do not", async () => {
    readsWith(mark.name);
    await kept();
    const others = (["reader", "lead", "witness", "administrator"] as const).map((role) => [role, sees(personWith(here, role).id)]);
    expect(others).toEqual([
      ["reader", false],
      ["lead", true],
      ["witness", true],
      ["administrator", false],
    ]);
    expect([sees(reader), sees(here.engineer.id)]).toEqual([true, true]);
  });

  test("is nobody with a part in another test only", async () => {
    readsWith(mark.name);
    await kept();
    const elsewhere = personWith({ db: here.db, test: testIn(here.db, here.vessel, here.engineer.id) }, "lead").id;
    expect(sees(elsewhere)).toBe(false);
    grantRole(here.db, { test: here.test, account: elsewhere, role: "lead" }, { by: null, at });
    expect(sees(elsewhere)).toBe(true);
  });
});
