import { expect, type Page, test } from "@playwright/test";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import { incliningResult } from "@/lib/lightship/inclining-result";
import { promised } from "@/lib/result";
import { type RecordedReading, recordedReadings } from "@/lib/sync/recorded-reading";
import { BrowserProfile } from "./browser-profile";
import { ConsoleWatch } from "./console-watch";
import { type Account, type DemoShip, demoShip } from "./demo-ship";
import { ReaderHand } from "./reader-hand";
import { codeFor, enrol, orderAgain, settle, signInByHand, takeTheLead } from "./wheelhouse";

const { record, truth } = skerryTern();
const readings = skerryTernReadings(7);
const all = recordedReadings(readings);
const id = record.test.id;

let ship: DemoShip;
let laptop: BrowserProfile;
let phone: BrowserProfile;
test.beforeAll(async () => {
  ship = await demoShip();
  laptop = await BrowserProfile.make({ viewport: { width: 1280, height: 800 } });
  phone = await BrowserProfile.make({ viewport: { width: 360, height: 780 }, hasTouch: true, isMobile: true });
});
test.afterAll(async () => {
  for (const profile of [laptop, phone]) await profile?.remove();
  await ship?.server.remove();
});

test("readings taken while the server is dead, through a reload and a killed browser, arrive and become the lightship", async () => {
  test.setTimeout(300_000);
  const lead = accountOf("lead");
  const wheelhouse = await laptop.open();
  const control = wheelhouse.pages()[0] ?? (await wheelhouse.newPage());
  const watches = [new ConsoleWatch(wheelhouse)];
  await signInByHand(control, ship, lead);
  await takeTheLead(control, ship, id);
  const code = await codeFor(control, "Rolf Lund");
  await orderAgain(control, 5);
  await expect(control.getByRole("button", { name: "Open move 5" })).toBeVisible();

  let below = await phone.open();
  watches.push(new ConsoleWatch(below));
  let hand = new ReaderHand(below.pages()[0] ?? (await below.newPage()), ship.server.url, id);
  await enrol(hand.page, ship, code, "Blue phone, aft");

  await ship.server.kill();
  for (const watch of watches) watch.serverIsDown();

  await test.step("readings of all kinds, no server", async () => {
    await hand.page.goto(`${ship.server.url}/readings`);
    await expect(hand.page.locator("h1")).toHaveText("MV Skerry Tern");
    for (const tank of ["GW", "BW-F"])
      await take(
        hand,
        one((slot) => slot.kind === "sounding" && slot.tank === tank && slot.round === "before"),
      );
    await take(
      hand,
      one((slot) => slot.kind === "draft" && slot.mark === "AP" && slot.round === "after"),
    );
    await take(hand, later(one((slot) => slot.kind === "water")));
    await hand.read({ kind: "note" }, { text: "Bilge pumps off since 09:40" });
    for (const reading of battensOf(5)) await take(hand, again(reading));
  });

  await test.step("what is being typed outlives a hard reload", async () => {
    await hand.open(batten(6, "A").slot);
    await hand.typeNumber(87.5);
    await hand.page.reload();
    await expect(hand.page.getByLabel("Typed")).toContainText("87.5");
    await hand.page.getByRole("button", { name: "Clear" }).click();
    await hand.enter(batten(6, "A").value);
    await hand.save();
  });

  await test.step("what is saved outlives a killed browser", async () => {
    await take(hand, batten(6, "B"));
    await hand.open(batten(6, "C").slot);
    await hand.typeNumber(91);
    await hand.page.waitForTimeout(1000);
    await phone.kill();
    below = await phone.open();
    watches.push(new ConsoleWatch(below));
    watches.at(-1)?.serverIsDown();
    hand = new ReaderHand(below.pages()[0] ?? (await below.newPage()), ship.server.url, id);
    await hand.open(batten(6, "C").slot);
    await expect(hand.page.getByLabel("Typed")).toContainText("91");
    await hand.page.getByRole("button", { name: "Clear" }).click();
    await hand.enter(batten(6, "C").value);
    await hand.save();
  });

  await test.step("more readings, and the phone says that it holds them all", async () => {
    await take(hand, batten(6, "U"));
    for (const reading of [...battensOf(7), ...battensOf(8)]) await take(hand, reading);
    await hand.page.goto(`${ship.server.url}/readings/held`);
    await expect(hand.page.getByRole("listitem")).toHaveCount(21);
    await expect(hand.page.getByText("21 saved on this phone, not sent yet").first()).toBeVisible();
  });

  await ship.server.start();
  for (const watch of watches) watch.serverIsBack();

  await test.step("they arrive on the open page in the wheelhouse, which nobody reloaded", async () => {
    await hand.page.getByRole("button", { name: "Send now" }).click();
    await expect(hand.page.getByText("All 21 on the server").first()).toBeVisible({ timeout: 30_000 });
    const row = control.getByRole("row", { name: /Blue phone, aft/ });
    await expect(row).toContainText("21 taken, 21 received", { timeout: 30_000 });
    await settle(control, /^A: 3\.009/, "Read again from the boat");
    await expect(control.getByText("Nothing waits for a decision.")).toBeVisible();
    await expect(control.getByText("9 of 9 moves in the line")).toBeVisible();
  });

  await test.step("the lightship agrees with the ship that was simulated", async () => {
    await control.goto(`${ship.server.url}/tests/${id}/lightship`);
    const found = await exportedResult(control);
    const careful = promised(incliningResult({ ...record, readings })).lightship;
    // the same readings but for the marks and samples not yet read after the moves
    expect(Math.abs(found.displacement - careful.displacement)).toBeLessThan(0.001 * truth.lightship.displacement);
    expect(Math.abs(found.displacement - truth.lightship.displacement)).toBeLessThan(0.002 * truth.lightship.displacement);
    expect(Math.abs(found.vcg - truth.lightship.vcg)).toBeLessThan(0.005);
    expect(Math.abs(found.lcg - truth.lightship.lcg)).toBeLessThan(0.02);
    await expect(control.getByText(/^1[\s,\u202f]?31\d\.\d/).first()).toBeVisible();
  });
  expect(watches.flatMap(({ errors }) => errors)).toEqual([]);
});

function accountOf(role: string): Account {
  const account = ship.accounts.get(role);
  if (!account) throw new Error(`the demo has no ${role}`);
  return account;
}

/** The result of the record that the page exports: what is shown is what the file gives. */
async function exportedResult(page: Page) {
  const response = await page.request.get(`${ship.server.url}/api/v1/tests/${id}/record`);
  expect(response.status()).toBe(200);
  return promised(incliningResult(await response.json())).lightship;
}

function take(hand: ReaderHand, { slot, value }: Pick<RecordedReading, "slot" | "value">): Promise<void> {
  return hand.read(slot, value);
}

function one(isIt: (slot: RecordedReading["slot"]) => boolean): RecordedReading {
  const found = all.find(({ slot }) => isIt(slot));
  if (!found) throw new Error("the simulated crew has no such reading");
  return found;
}

function batten(move: number, station: string): RecordedReading {
  return one((slot) => slot.kind === "batten" && slot.move === move && slot.station === station);
}

function battensOf(move: number): RecordedReading[] {
  return ["A", "B", "C", "U"].map((station) => batten(move, station));
}

/** The water has not changed since before the moves. */
function later({ slot, value }: RecordedReading): Pick<RecordedReading, "slot" | "value"> {
  return slot.kind === "water" ? { slot: { ...slot, round: "after" }, value } : { slot, value };
}

function again({ slot, value }: RecordedReading): Pick<RecordedReading, "slot" | "value"> {
  return slot.kind === "batten" ? { slot: { ...slot, repeat: 2 }, value } : { slot, value };
}
