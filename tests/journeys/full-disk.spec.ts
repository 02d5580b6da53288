import { closeSync, fsyncSync, openSync, rmSync, writeSync } from "node:fs";
import path from "node:path";
import { expect, type Page, test } from "@playwright/test";
import { skerryTern } from "@/db/seed/skerry-tern";
import { BrowserProfile } from "./browser-profile";
import { batten, battensOf } from "./crew-readings";
import { accountOf, type DemoShip, demoShip } from "./demo-ship";
import { ReaderHand } from "./reader-hand";
import { codeFor, enrol, signInByHand, takeTheLead } from "./wheelhouse";

const id = skerryTern().record.test.id;

let ship: DemoShip;
const profiles: BrowserProfile[] = [];

test.afterAll(async () => {
  for (const profile of profiles) await profile.remove();
  await ship?.server.remove();
});

test("a server whose disk is full stores nothing by halves; the phone keeps everything and sends it once there is room", async () => {
  ship = await demoShip();
  await ship.server.stop();
  await ship.server.startOnSmallDisk(16);
  const control = await page({ width: 1280, height: 800 });
  await signInByHand(control, ship, accountOf(ship, "lead"));
  await takeTheLead(control, ship, id);
  const hand = new ReaderHand(await page({ width: 360, height: 780 }), ship.server.url, id);
  await enrol(hand.page, ship, await codeFor(control, "Rolf Lund"), "Blue phone, aft");

  const statuses: number[] = [];
  hand.page.on("response", (answer) => answer.url().endsWith("/api/v1/sync") && statuses.push(answer.status()));
  const makeRoom = fill(ship.server.folderSeen);
  for (const { slot, value } of [...battensOf(6), batten(7, "A")]) await hand.read(slot, value);
  await hand.page.goto(`${ship.server.url}/readings/held`);
  await hand.page.getByRole("button", { name: "Send now" }).click();
  await expect.poll(() => statuses, { timeout: 20_000 }).toContain(507);
  await expect(hand.page.getByText("5 saved on this phone, not sent yet").first()).toBeVisible();

  makeRoom();
  await hand.page.getByRole("button", { name: "Send now" }).click();
  await expect(hand.page.getByText("All 5 on the server").first()).toBeVisible({ timeout: 30_000 });
  await expect(control.getByRole("row", { name: /Blue phone, aft/ })).toContainText("5 taken, 5 received", { timeout: 30_000 });
});

async function page(viewport: { width: number; height: number }): Promise<Page> {
  const profile = await BrowserProfile.make({ viewport });
  profiles.push(profile);
  const context = await profile.open();
  return context.pages()[0] ?? context.newPage();
}

/** Writes until nothing more fits; what it gives back makes room again. */
function fill(folder: string): () => void {
  const ballast = path.join(folder, "ballast");
  const file = openSync(ballast, "w");
  for (const size of [1 << 16, 1 << 12, 1]) writeWhileItFits(file, Buffer.alloc(size, 1));
  fsyncSync(file);
  closeSync(file);
  return () => rmSync(ballast);
}

function writeWhileItFits(file: number, piece: Buffer): void {
  try {
    for (;;) writeSync(file, piece);
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== "ENOSPC") throw error;
  }
}
