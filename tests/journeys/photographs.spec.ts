import { expect, type Page, test } from "@playwright/test";
import { skerryTern } from "@/db/seed/skerry-tern";
import { BrowserProfile } from "./browser-profile";
import { ConsoleWatch } from "./console-watch";
import { batten } from "./crew-readings";
import { accountOf, type DemoShip, demoShip } from "./demo-ship";
import { ReaderHand } from "./reader-hand";
import { codeFor, enrol, signInByHand, takeTheLead } from "./wheelhouse";

/** A photograph from below deck to the office: each test goes on where the one before has ended. */
test.describe.configure({ mode: "serial" });

const id = skerryTern().record.test.id;
const reading = batten(6, "A");
const secret = "58 58 12 N 5 44 20 E";
const words = /^Photograph of station A at move 6, taken \d\d:\d\d:\d\d by Rolf Lund$/;

let ship: DemoShip;
let laptop: BrowserProfile;
let phone: BrowserProfile;
let office: Page;
let hand: ReaderHand;
const watches: ConsoleWatch[] = [];

test.beforeAll(async () => {
  ship = await demoShip();
  laptop = await BrowserProfile.make({ viewport: { width: 1280, height: 800 } });
  phone = await BrowserProfile.make({ viewport: { width: 360, height: 780 }, hasTouch: true, isMobile: true });
});
test.afterAll(async () => {
  for (const profile of [laptop, phone]) await profile?.remove();
  await ship?.server.remove();
});

test("a phone is enrolled, and the server goes away", async () => {
  office = await opened(laptop);
  await signInByHand(office, ship, accountOf(ship, "lead"));
  await takeTheLead(office, ship, id);
  const code = await codeFor(office, "Rolf Lund");
  hand = new ReaderHand(await opened(phone), ship.server.url, id);
  await enrol(hand.page, ship, code, "Blue phone, aft");
  await expect(office.getByRole("row", { name: /Blue phone, aft/ })).toBeVisible();
  for (const watch of watches) watch.serverIsDown();
  await ship.server.kill();
});

test("a batten is photographed without signal, and both stand on the phone", async () => {
  await hand.open(reading.slot);
  await hand.page.getByLabel("Photograph", { exact: true }).setInputFiles(await cameraPicture(hand.page));
  await expect(hand.page.getByRole("button", { name: "Take out photograph 1" })).toBeVisible();
  // the key that saves is still within thumb's reach
  await expect(hand.page.getByRole("button", { name: "Save", exact: true })).toBeInViewport({ ratio: 1 });
  await hand.enter(reading.value);
  await hand.save();
  await expect(hand.page.getByText("1 photograph still on this phone")).toBeVisible();
});

test("what is no picture is refused in a sentence, and the reading goes on", async () => {
  const next = batten(7, "A");
  await hand.open(next.slot);
  const note = { name: "note.jpg", mimeType: "image/jpeg", buffer: Buffer.from("no picture at all") };
  await hand.page.getByLabel("Photograph", { exact: true }).setInputFiles(note);
  await expect(hand.page.getByText("This file is no picture that this browser can read.")).toBeVisible();
  await hand.enter(next.value);
  await hand.save();
});

test("it outlives a hard reload, and arrives after its reading once the server is back", async () => {
  await hand.page.reload();
  await expect(hand.page.getByText("1 photograph still on this phone")).toBeVisible();
  await ship.server.start();
  for (const watch of watches) watch.serverIsBack();
  await hand.page.goto(`${ship.server.url}/readings/held`);
  await hand.page.getByRole("button", { name: "Send now" }).click();
  await expect(hand.page.getByText("All 2 on the server").first()).toBeVisible({ timeout: 30_000 });
  await expect(hand.page.getByText("photograph still on this phone").first()).toBeHidden({ timeout: 30_000 });
});

test("the office sees it in the reading's history, and large, by the keyboard alone", async () => {
  await office.goto(`${ship.server.url}/tests/${id}/reconcile`);
  const row = office.getByRole("row", { name: /station A at move 6/i });
  await row.getByText("1 reading").click();
  const small = row.getByRole("button", { name: words });
  const width = () => small.getByRole("img").evaluate((image: HTMLImageElement) => image.naturalWidth);
  await expect.poll(width).toBe(1600);
  await small.focus();
  await office.keyboard.press("Enter");
  const dialog = office.getByRole("dialog", { name: words });
  await expect(dialog.getByRole("img", { name: words })).toBeInViewport({ ratio: 1 });
  await office.keyboard.press("Escape");
  await expect(dialog).toBeHidden();
  await expect(small).toBeFocused();
});

test("nothing but the picture has come: no place, no maker", async () => {
  const address = await office.getByRole("img", { name: words }).first().getAttribute("src");
  const response = await office.request.get(`${ship.server.url}${address}`);
  const bytes = await response.body();
  expect(response.headers()["content-type"]).toBe("image/jpeg");
  expect([bytes.includes("Exif"), bytes.includes(secret)]).toEqual([false, false]);
});

test("no page has written an error on its way", () => {
  expect(watches.flatMap(({ errors }) => errors)).toEqual([]);
});

/** A JPEG larger than what is kept, with the place where it was taken, as a camera writes it. Source: JPEG APP1, Exif 2.32 §4.7.2. */
async function cameraPicture(page: Page) {
  const drawn = await page.evaluate(async () => {
    const canvas = new OffscreenCanvas(2400, 1800);
    const context = canvas.getContext("2d");
    if (context) for (let x = 0; x < 2400; x += 20) context.fillRect(x, 0, 4, 900);
    const blob = await canvas.convertToBlob({ type: "image/jpeg", quality: 0.9 });
    return Array.from(new Uint8Array(await blob.arrayBuffer()));
  });
  const app1 = Buffer.concat([Buffer.from("Exif\0\0", "latin1"), Buffer.from(secret, "latin1")]);
  const head = Buffer.from([0xff, 0xe1, 0, app1.length + 2]);
  const buffer = Buffer.concat([Buffer.from(drawn.slice(0, 2)), head, app1, Buffer.from(drawn.slice(2))]);
  return { name: "IMG_0412.jpg", mimeType: "image/jpeg", buffer };
}

async function opened(profile: BrowserProfile): Promise<Page> {
  const context = await profile.open();
  watches.push(new ConsoleWatch(context));
  return context.pages()[0] ?? context.newPage();
}
