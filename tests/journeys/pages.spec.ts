import { expect, type Page, test } from "@playwright/test";
import { appRoutes } from "./app-routes";
import { ConsoleWatch } from "./console-watch";
import { addressOf, type DemoShip, demoShip, signIn } from "./demo-ship";
import { visitorOf } from "./page-visitors";

const screens = { phone: { width: 360, height: 780 }, laptop: { width: 1280, height: 800 } };

let ship: DemoShip;
test.beforeAll(async () => {
  ship = await demoShip();
});
test.afterAll(async () => {
  await ship?.server.remove();
});

for (const route of appRoutes()) {
  for (const [screen, viewport] of Object.entries(screens)) {
    test(`${route} stands on a ${screen} without an error`, async ({ browser }) => {
      const context = await browser.newContext({ viewport });
      const watch = new ConsoleWatch(context);
      const visitor = visitorOf(route);
      if (visitor !== null) await signIn(context, ship, visitor);
      const address = await addressOf(route, ship, context);
      const page = await context.newPage();
      const response = await page.goto(address);
      expect(response?.status()).toBe(200);
      expect(new URL(page.url()).pathname).toBe(new URL(address).pathname);
      await expectWholePage(page);
      expect(watch.errors).toEqual([]);
      await context.close();
    });
  }
}

/** One heading that names the page, a title, and nothing beyond the right edge. */
async function expectWholePage(page: Page): Promise<void> {
  await expect(page.locator("h1")).toHaveCount(1);
  await expect(page.locator("h1")).not.toBeEmpty();
  await expect(page).toHaveTitle(/\S/);
  // what a page fetches after its first paint may still widen it
  await page.waitForTimeout(500);
  const { wide, seen } = await page.evaluate(() => ({ wide: document.documentElement.scrollWidth, seen: window.innerWidth }));
  expect(wide, "the page is wider than its screen").toBeLessThanOrEqual(seen);
}
