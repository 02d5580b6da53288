import { expect, type Page, test } from "@playwright/test";
import { skerryTern } from "@/db/seed/skerry-tern";
import { BrowserProfile } from "./browser-profile";
import { ConsoleWatch } from "./console-watch";
import { batten } from "./crew-readings";
import { accountOf, type DemoShip, demoShip } from "./demo-ship";
import { NewerBuild } from "./newer-build";
import { ReaderHand } from "./reader-hand";
import { codeFor, enrol, signInByHand, takeTheLead } from "./wheelhouse";

/** A new version is put on the server on the day of the test, under pages that are open. */
test.describe.configure({ mode: "serial" });

const id = skerryTern().record.test.id;

let ship: DemoShip;
let newer: NewerBuild;
let laptop: BrowserProfile;
let phone: BrowserProfile;
let control: Page;
let hand: ReaderHand;
const chunks = new Set<string>();
const watches: ConsoleWatch[] = [];

test.beforeAll(async () => {
  test.setTimeout(300_000);
  newer = await NewerBuild.make();
  ship = await demoShip();
  laptop = await BrowserProfile.make({ viewport: { width: 1280, height: 800 } });
  phone = await BrowserProfile.make({ viewport: { width: 360, height: 780 }, hasTouch: true, isMobile: true });
});
test.afterAll(async () => {
  for (const profile of [laptop, phone]) await profile?.remove();
  await ship?.server.remove();
  await newer?.remove();
});

test("a phone and the wheelhouse stand open in the version of the morning", async () => {
  control = await firstPage(laptop);
  await signInByHand(control, ship, accountOf(ship, "lead"));
  await takeTheLead(control, ship, id);
  hand = new ReaderHand(await firstPage(phone), ship.server.url, id);
  await enrol(hand.page, ship, await codeFor(control, "Rolf Lund"), "Blue phone, aft");
  await expect(control.getByRole("row", { name: /Blue phone, aft/ })).toBeVisible();
});

test("what is read in the old page while the server changes arrives in the new one", async () => {
  await hand.open(batten(6, "A").slot);
  for (const watch of watches) watch.serverIsDown();
  await ship.server.stop();
  await newer.stepsForward();
  ship.server.build = newer.folder;
  await hand.enter(batten(6, "A").value);
  await hand.save();
  await ship.server.start();
  for (const watch of watches) watch.serverIsBack();
  // a page of the old version, reached from one of the old version: its chunks are kept on the phone
  await hand.page.getByRole("link", { name: /saved on this phone|on the server/ }).click();
  await hand.page.getByRole("button", { name: "Send now" }).click();
  await expect(hand.page.getByText("All 1 on the server").first()).toBeVisible({ timeout: 30_000 });
  await expect(hand.page.getByText("newer", { exact: true })).toHaveCount(0);
});

test("the wheelhouse's open page goes on, and every chunk of the version of the morning is still served", async () => {
  await expect(control.getByRole("row", { name: /Blue phone, aft/ })).toContainText("1 taken, 1 received", { timeout: 30_000 });
  const own = await newer.ownFiles();
  expect([...chunks].filter((chunk) => !own.some((file) => chunk.endsWith(file)))).not.toEqual([]);
  for (const chunk of chunks) expect((await control.request.get(chunk)).status(), chunk).toBe(200);
});

test("the change-over waits for an entry that is not finished, and then for a person", async () => {
  await hand.open(batten(6, "B").slot);
  await hand.typeNumber(8);
  await expect(hand.page.getByText("A new version is ready.")).toBeVisible({ timeout: 30_000 });
  const changeOver = hand.page.getByRole("button", { name: "Change over" });
  await changeOver.click();
  await expect(hand.page.getByText("Finish or clear the entry you are typing first.")).toBeVisible();
  await expect(hand.page.getByLabel("Typed")).toContainText("8");
  await hand.page.getByRole("button", { name: "Clear" }).click();
  await hand.enter(batten(6, "B").value);
  await hand.save();
  const reloaded = hand.page.waitForEvent("load");
  await changeOver.click();
  await reloaded;
  await expect(hand.page.getByText("A new version is ready.")).toHaveCount(0);
  await hand.page.goto(`${ship.server.url}/readings/held`);
  await expect(hand.page.getByText(newer.version, { exact: true })).toBeVisible();
  await expect(hand.page.getByText("All 2 on the server").first()).toBeVisible({ timeout: 30_000 });
});

test("the newer phone sends to the older server too, when that has to be put back", async () => {
  for (const watch of watches) watch.serverIsDown();
  await ship.server.stop();
  await newer.stepsBack();
  ship.server.build = ".next";
  await hand.read(batten(6, "C").slot, batten(6, "C").value);
  await ship.server.start();
  for (const watch of watches) watch.serverIsBack();
  await hand.page.goto(`${ship.server.url}/readings/held`);
  await hand.page.getByRole("button", { name: "Send now" }).click();
  await expect(hand.page.getByText("All 3 on the server").first()).toBeVisible({ timeout: 30_000 });
  await expect(control.getByRole("row", { name: /Blue phone, aft/ })).toContainText("3 taken, 3 received", { timeout: 30_000 });
});

test("no page has written an error on its way", () => {
  expect(watches.flatMap(({ errors }) => errors)).toEqual([]);
});

async function firstPage(profile: BrowserProfile): Promise<Page> {
  const context = await profile.open();
  watches.push(new ConsoleWatch(context));
  context.on("response", (answer) => answer.url().includes("/_next/static/") && chunks.add(answer.url()));
  return context.pages()[0] ?? context.newPage();
}
