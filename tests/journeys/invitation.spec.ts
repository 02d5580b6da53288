import { expect, test } from "@playwright/test";
import { accountOf, type DemoShip, demoShip } from "./demo-ship";
import { signInByHand } from "./wheelhouse";

let ship: DemoShip;
test.beforeAll(async () => {
  ship = await demoShip();
});
test.afterAll(async () => {
  await ship?.server.remove();
});

test("an administrator invites a witness, who sets a password, signs in, and finds the test; then the account is closed", async ({
  browser,
}) => {
  const office = await (await browser.newContext()).newPage();
  await signInByHand(office, ship, accountOf(ship, "administrator"));
  await office.getByRole("link", { name: "People" }).click();
  await office.getByText("Invite by e-mail").click();
  await office.getByLabel("Name", { exact: true }).fill("Vera Lind");
  await office.getByLabel("E-mail").fill("vera@class.example");
  await office.getByRole("button", { name: "Invite", exact: true }).click();
  const link = await office.getByText(/\/password#token=/).textContent();
  await office.getByRole("link", { name: "Vera Lind" }).click();
  await office.getByLabel("As", { exact: true }).selectOption("witness");
  await office.getByRole("button", { name: "Give the part" }).click();
  await expect(office.getByText("witness: Inclining test after conversion")).toBeVisible();

  const vera = await (await browser.newContext()).newPage();
  await vera.goto(link ?? "");
  await vera.getByLabel("New password").fill("short");
  await vera.getByLabel("The same again").fill("short");
  await vera.getByRole("button", { name: "Set the password" }).click();
  await expect(vera.getByText("At least 12 characters: a few words")).toBeVisible();
  await vera.getByLabel("New password").fill("three pendulums below");
  await vera.getByLabel("The same again").fill("three pendulums below");
  await vera.getByRole("button", { name: "Set the password" }).click();
  await expect(vera.getByText("Your password is set")).toBeVisible();
  await signInByHand(vera, ship, { email: "vera@class.example", password: "three pendulums below" });
  await expect(vera.getByRole("link", { name: "Inclining test after conversion" })).toBeVisible();

  await office.getByRole("button", { name: "Close the account" }).click();
  await office.getByRole("button", { name: "Close the account" }).click();
  await expect(office.getByText("closed", { exact: true })).toBeVisible();
  await vera.goto(`${ship.server.url}/tests`);
  await expect(vera).toHaveURL(/\/sign-in/);
});
