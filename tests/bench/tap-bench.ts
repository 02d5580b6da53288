import { existsSync } from "node:fs";
import type { Page } from "@playwright/test";
import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import { recordedReadings } from "@/lib/sync/recorded-reading";
import { browserLaunch } from "../journeys/browser-launch";
import { BrowserProfile } from "../journeys/browser-profile";
import { type DemoShip, demoShip, signIn } from "../journeys/demo-ship";
import { ReaderHand } from "../journeys/reader-hand";
import { enrol } from "../journeys/wheelhouse";
import { percentile } from "./bench-server";

type Stopwatch = { taps: number[] };

/** From the tap on Save to the words "Saved on this phone", against nothing but a strict put of as many bytes on the same page. */
export async function tapToSaved(count = 30): Promise<void> {
  const build = process.env.NEXT_DIST_DIR ?? ".next";
  if (!existsSync(`${build}/BUILD_ID`) || !existsSync(browserLaunch.executablePath)) {
    console.log("From the tap to saved: NOT RUN, it needs the production build (npm run build) and Chromium");
    return;
  }
  const ship = await demoShip();
  const phone = await BrowserProfile.make({ viewport: { width: 360, height: 780 }, hasTouch: true, isMobile: true });
  try {
    const context = await phone.open();
    await context.addInitScript(stopwatch);
    const page = context.pages()[0] ?? (await context.newPage());
    await enrol(page, ship, await readersCode(ship), "Blue phone, aft");
    const taps = await readings(page, ship, count);
    const puts = await page.evaluate(strictPuts, { count: 200, bytes: 900 });
    console.log(`On the phone's page in Chromium, ${taps.length} batten readings`);
    line("from the tap on Save to the words on the screen", taps);
    line("nothing but one strict put of 900 bytes", puts);
    console.log(`  ratio ${(percentile(taps, 0.5) / percentile(puts, 0.5)).toFixed(1)}`);
  } finally {
    await phone.remove();
    await ship.server.remove();
  }
}

async function readersCode(ship: DemoShip): Promise<string> {
  const desk = await BrowserProfile.make();
  try {
    const context = await desk.open();
    await signIn(context, ship, "lead");
    const data = { role: "reader", personName: "Rolf Lund" };
    const made = await context.request.post(`${ship.server.url}/api/v1/tests/${skerryTern().record.test.id}/enrolments`, { data });
    return (await made.json()).code;
  } finally {
    await desk.remove();
  }
}

async function readings(page: Page, ship: DemoShip, count: number): Promise<number[]> {
  const hand = new ReaderHand(page, ship.server.url, skerryTern().record.test.id);
  const battens = recordedReadings(skerryTernReadings(7)).filter(({ slot, value }) => slot.kind === "batten" && "valuesMm" in value);
  const times: number[] = [];
  for (const { slot, value } of battens.slice(0, count)) {
    await hand.open(slot);
    await hand.enter(value);
    await hand.save();
    times.push(...(await page.evaluate(() => (window as unknown as Stopwatch).taps.splice(0))));
  }
  return times;
}

/** Runs on the page: the clock starts with the tap and stops when the words stand in the document. Functions have no names there. */
function stopwatch(): void {
  const watch = window as unknown as Stopwatch;
  const clock: { tapped: number | null } = { tapped: null };
  watch.taps = [];
  addEventListener(
    "click",
    ({ target }) => {
      const label = target instanceof Element ? target.closest("button")?.textContent?.trim() : "";
      if (label === "Save" || label === "I looked again: save") clock.tapped = performance.now();
    },
    true,
  );
  new MutationObserver(() => {
    if (clock.tapped === null || ![...document.querySelectorAll("p")].some((each) => each.textContent === "Saved on this phone")) return;
    watch.taps.push(performance.now() - clock.tapped);
    clock.tapped = null;
  }).observe(document, { subtree: true, childList: true, characterData: true });
}

/** Runs on the page: how long each put takes until its transaction is complete. */
async function strictPuts({ count, bytes }: { count: number; bytes: number }): Promise<number[]> {
  const db = await new Promise<IDBDatabase>((done, fail) => {
    const opening = indexedDB.open("bench", 1);
    opening.onupgradeneeded = () => opening.result.createObjectStore("rows", { keyPath: "id" });
    opening.onsuccess = () => done(opening.result);
    opening.onerror = () => fail(opening.error);
  });
  const times: number[] = [];
  for (let id = 0; id < count; id++) {
    const start = performance.now();
    await new Promise<void>((done, fail) => {
      const transaction = db.transaction("rows", "readwrite", { durability: "strict" });
      transaction.objectStore("rows").put({ id, body: "x".repeat(bytes) });
      transaction.oncomplete = () => done();
      transaction.onerror = () => fail(transaction.error);
    });
    times.push(performance.now() - start);
  }
  return times;
}

function line(name: string, times: readonly number[]): void {
  const ms = (share: number) => `${percentile(times, share).toFixed(1)} ms`;
  console.log(`  ${name.padEnd(52)} p50 ${ms(0.5)}, p99 ${ms(0.99)}`);
}
