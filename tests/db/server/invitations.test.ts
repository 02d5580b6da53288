import { mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { afterAll, beforeAll, expect, test } from "vitest";
import { accountByEmail } from "@/db/server/accounts";
import { invite, inviteAgain, mailForgottenPassword } from "@/db/server/invitations";
import { keptMails } from "@/db/server/mail";
import { setPasswordByLink } from "@/db/server/password-links";
import { promised } from "@/lib/result";
import { at, yard } from "./yard";

let folder: string;
beforeAll(() => {
  folder = mkdtempSync(path.join(tmpdir(), "battenbook-"));
  process.env.BATTENBOOK_DATA = folder;
});
afterAll(() => rmSync(folder, { recursive: true }));

const site = "https://batten.example";
const iris = { name: "Iris", email: "iris@class.example", isAdministrator: false, isEngineer: false };

test("an invitation makes the account and mails a link that sets its password", async () => {
  const { db, engineer } = yard();
  const { account, link, mail } = promised(await invite(db, iris, site, { by: engineer.id, at }));
  expect(account).toMatchObject({ name: "Iris", email: "iris@class.example", passwordHash: null });
  expect(link).toMatch(/^https:\/\/batten\.example\/password#token=[\w-]{32}$/);
  expect(mail).toBe("kept");
  const [kept] = keptMails();
  expect(kept).toMatchObject({ to: "iris@class.example", at });
  expect(kept?.text).toContain(link);
  expect(promised(setPasswordByLink(db, link.split("token=")[1] ?? "", "a hash", at)).id).toBe(account.id);
  expect(await invite(db, iris, site, { by: engineer.id, at })).toMatchObject({ ok: false, refusal: { type: "EmailTaken" } });
});

test("whoever has no address is told by nobody: the link goes to whoever made it", async () => {
  const { db, engineer } = yard();
  expect((await inviteAgain(db, { ...engineer, email: null }, site, { by: engineer.id, at })).mail).toBe("refused");
});

test("a forgotten password is mailed to whoever has the address, and to nobody else", async () => {
  const { db } = yard();
  const before = keptMails().length;
  await mailForgottenPassword(db, "nobody@yard.example", site, at);
  expect(keptMails()).toHaveLength(before);
  await mailForgottenPassword(db, "Ellen@yard.example", site, at);
  const mail = keptMails().find(({ to }) => to === "ellen@yard.example");
  const token = /token=([\w-]+)/.exec(mail?.text ?? "")?.[1] ?? "";
  expect(promised(setPasswordByLink(db, token, "a hash", at)).id).toBe(accountByEmail(db, "ellen@yard.example")?.id);
});
