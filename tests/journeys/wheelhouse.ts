import { expect, type Page } from "@playwright/test";
import type { Account, DemoShip } from "./demo-ship";

/** Signs in on the page itself, as a person does. */
export async function signInByHand(page: Page, ship: DemoShip, { email, password }: Account): Promise<void> {
  await page.goto(`${ship.server.url}/sign-in`);
  await page.getByLabel("E-mail").fill(email);
  await page.getByLabel("Password").fill(password);
  await page.getByRole("button", { name: /sign in/i }).click();
  await page.waitForURL(/\/tests$/);
}

/** Opens central control of a test, and makes this browser one that gives orders. */
export async function takeTheLead(page: Page, ship: DemoShip, test: string): Promise<void> {
  await page.goto(`${ship.server.url}/tests/${test}/control`);
  await page.getByRole("button", { name: "Give orders from this device" }).click();
  await expect(page.getByRole("button", { name: "Make a code" })).toBeVisible();
  await expect(page.getByRole("button", { name: /^Open move/ })).toBeVisible();
}

/** Makes a code for a reader, and reads it off the page as the reader does. */
export async function codeFor(page: Page, name: string): Promise<string> {
  await page.getByLabel("Person who reads").fill(name);
  await page.getByRole("button", { name: "Make a code" }).click();
  const code = await page.getByText(/^[0-9A-Z]{4}-[0-9A-Z]{4}$/).textContent();
  if (code === null) throw new Error("the page shows no code");
  return code;
}

/** Enrols a phone by a code, as the QR code opens the page. */
export async function enrol(page: Page, ship: DemoShip, code: string, name: string): Promise<void> {
  await page.goto(`${ship.server.url}/join#code=${code}`);
  await page.getByLabel("What this phone is called").fill(name);
  await page.getByRole("button", { name: "Enrol this phone" }).click();
  await expect(page.getByText("This phone is enrolled")).toBeVisible({ timeout: 30_000 });
  await expect(page.getByText("The pages are kept")).toBeVisible();
}

/** Settles the first open disagreement by one of the readings. */
export async function settle(page: Page, choice: RegExp, reason: string): Promise<void> {
  await page.getByLabel(choice).check();
  await page.getByLabel("Reason").fill(reason);
  await page.getByRole("button", { name: "Settle" }).click();
}

/** Orders a closed move once more. */
export async function orderAgain(page: Page, move: number): Promise<void> {
  await page.getByText("Repeat or exclude a move").click();
  await page.getByLabel("Move", { exact: true }).selectOption(String(move));
  await page.getByRole("button", { name: `Repeat move ${move}` }).click();
  await page.getByRole("button", { name: "Order repeat 2" }).click();
}
