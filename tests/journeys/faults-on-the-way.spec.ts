import { mkdtemp, readdir, rm } from "node:fs/promises";
import { tmpdir } from "node:os";
import path from "node:path";
import { setTimeout as sleep } from "node:timers/promises";
import { expect, type Page, test } from "@playwright/test";
import { skerryTern } from "@/db/seed/skerry-tern";
import { BrowserProfile } from "./browser-profile";
import { batten, battensOf, crewRead, sounding, type Taken } from "./crew-readings";
import { accountOf, type DemoShip, demoShip } from "./demo-ship";
import { FaultyProxy } from "./faulty-proxy";
import { ReaderHand } from "./reader-hand";
import { codeFor, enrol, signInByHand, takeTheLead } from "./wheelhouse";

/** One phone, one server, and everything that can happen between them: each test ends healed and settled. */
test.describe.configure({ mode: "serial" });

const id = skerryTern().record.test.id;
const clear = { type: "clear" } as const;

let way: FaultyProxy;
let ship: DemoShip;
let laptop: BrowserProfile;
let phone: BrowserProfile;
let control: Page;
let hand: ReaderHand;
let taken = 0;

test.beforeAll(async () => {
  way = await FaultyProxy.make();
  ship = await demoShip(way.url);
  way.leadsTo(ship.server.port);
  laptop = await BrowserProfile.make({ viewport: { width: 1280, height: 800 } });
  phone = await BrowserProfile.make({ viewport: { width: 360, height: 780 }, hasTouch: true, isMobile: true });
});
test.afterAll(async () => {
  for (const profile of [laptop, phone]) await profile?.remove();
  await ship?.server.remove();
  await way?.remove();
});

test("a phone is enrolled over the way", async () => {
  control = await firstPage(laptop);
  await signInByHand(control, ship, accountOf(ship, "lead"));
  await takeTheLead(control, ship, id);
  hand = new ReaderHand(await firstPage(phone), ship.server.url, id);
  await enrol(hand.page, ship, await codeFor(control, "Rolf Lund"), "Blue phone, aft");
  await expect(control.getByRole("row", { name: /Blue phone, aft/ })).toBeVisible();
});

test("cuts of some seconds, again and again, lose nothing", async () => {
  for (const reading of battensOf(6)) {
    way.turns({ type: "cut" });
    await take(reading);
    await sleep(700);
    way.turns(clear);
    await sleep(300);
  }
  await settles();
});

test("an answer lost after the server has stored the readings doubles nothing", async () => {
  way.turns({ type: "answer-lost" });
  const passed = way.passed;
  await take(batten(7, "A"));
  await take(batten(7, "B"));
  await expect.poll(() => way.passed, { timeout: 20_000 }).toBeGreaterThan(passed);
  await expectUnsent(2);
  way.turns(clear);
  await settles();
});

for (const delay of [0, 4, 15]) {
  test(`a server killed ${delay} ms after a batch has reached it keeps all of it or none`, async () => {
    way.turns({ type: "cut" });
    for (const reading of {
      0: [batten(7, "C"), batten(7, "U")],
      4: [batten(8, "A"), batten(8, "B")],
      15: [batten(8, "C"), batten(8, "U")],
    }[delay] ?? []) {
      await take(reading);
    }
    const killed = new Promise<void>((resolve, reject) => {
      way.onSending = () => {
        way.onSending = null;
        setTimeout(() => ship.server.kill().then(resolve, reject), delay);
      };
    });
    way.turns(clear);
    await sendNow();
    await killed;
    await expectUnsent(2);
    await ship.server.start();
    await settles();
  });
}

test("a browser killed while its readings are on the way still has them", async () => {
  way.turns({ type: "half-open" });
  await take(sounding("GW"));
  await expect(hand.page.getByText("1 saved on this phone").first()).toBeVisible();
  await phone.kill();
  hand = new ReaderHand(await firstPage(phone), ship.server.url, id);
  await expectUnsent(1);
  way.turns(clear);
  await settles();
});

for (const status of [200, 302] as const) {
  test(`a harbour's guest network that answers ${status} for everything is taken for silence`, async () => {
    way.turns({ type: "portal", status });
    await take(status === 200 ? sounding("BW-F") : crewRead((slot) => slot.kind === "draft" && slot.round === "after"));
    await sendNow();
    await expectUnsent(1);
    way.turns(clear);
    await settles();
  });
}

for (const status of [401, 403]) {
  test(`a server that asks who is sending (${status}) pauses the sending, not the reading`, async () => {
    way.turns({ type: "refusing", status });
    await takeNote(`Gangway landed, ${status}`);
    await sendNow();
    await expect(hand.page.getByText("1 saved on this phone: sign in to send. Readings go on").first()).toBeVisible();
    await takeNote(`Moorings slack, ${status}`);
    await expect(hand.page.getByText("2 saved on this phone: sign in to send. Readings go on").first()).toBeVisible();
    way.turns(clear);
    await settles();
  });
}

for (const status of [413, 429, 500, 507]) {
  test(`a refusal as a whole (${status}) leaves everything on the phone`, async () => {
    way.turns({ type: "refusing", status });
    await takeNote(`Bilges dry, ${status}`);
    await sendNow();
    await expectUnsent(1);
    way.turns(clear);
    await settles();
  });
}

test("a server restored from an older backup gets again from the phone what the backup lacks", async () => {
  const folder = await mkdtemp(path.join(tmpdir(), "battenbook-backups-"));
  ship.server.backupFolder = folder;
  await ship.server.command("db/server/commands/backup.ts");
  await takeNote("Read after the backup was made");
  await takeNote("And one more");
  await settles();
  await ship.server.kill();
  const [copy = ""] = (await readdir(folder)).filter((name) => name.endsWith(".db"));
  expect(await ship.server.command("db/server/commands/restore.ts", path.join(folder, copy))).toContain("New epoch");
  await ship.server.start();
  await settles();
  await rm(folder, { recursive: true });
});

test("in the end the wheelhouse has each once, the ledger is whole, and the events alone give what stands", async () => {
  await expect(control.getByRole("row", { name: /Blue phone, aft/ })).toContainText(`${taken} taken, ${taken} received`, {
    timeout: 30_000,
  });
  expect(await ship.server.command("db/server/commands/ledger-verify.ts")).not.toContain("does not fit");
  expect(await ship.server.command("db/server/commands/rebuild.ts")).toContain("as they stood");
});

async function firstPage(profile: BrowserProfile): Promise<Page> {
  const context = await profile.open();
  return context.pages()[0] ?? context.newPage();
}

async function take({ slot, value }: Taken): Promise<void> {
  await hand.read(slot, value);
  taken += 1;
}

function takeNote(text: string): Promise<void> {
  return take({ slot: { kind: "note" }, value: { text } });
}

async function heldPage(): Promise<void> {
  const address = `${ship.server.url}/readings/held`;
  if (hand.page.url() !== address) await hand.page.goto(address);
}

async function sendNow(): Promise<void> {
  await heldPage();
  await hand.page.getByRole("button", { name: "Send now" }).click();
}

async function expectUnsent(count: number): Promise<void> {
  await heldPage();
  await expect(hand.page.getByText(`${count} saved on this phone, not sent yet`).first()).toBeVisible({ timeout: 20_000 });
}

/** The queue drains, nothing is set aside, and nothing has arrived twice. */
async function settles(): Promise<void> {
  await sendNow();
  const settled = new RegExp(`^All ${taken} on the server(, (\\d+ )?backed up)?$`);
  await expect(hand.page.getByText(settled).first()).toBeVisible({ timeout: 40_000 });
}
