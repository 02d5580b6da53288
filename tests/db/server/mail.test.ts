import { mkdtempSync, readdirSync, readFileSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { SMTPServer } from "smtp-server";
import { afterAll, afterEach, beforeAll, expect, test } from "vitest";
import { keptMails, sendMail } from "@/db/server/mail";

const at = "2026-05-04T07:00:00.000Z";
const report = { filename: "report.pdf", content: new TextEncoder().encode("%PDF-1.7"), contentType: "application/pdf" };
const mail = { to: "iris@class.example", subject: "Report 1", text: "The report.", attachments: [report] };

let folder: string;
beforeAll(() => {
  folder = mkdtempSync(path.join(tmpdir(), "battenbook-"));
  process.env.BATTENBOOK_DATA = folder;
});
afterEach(() => {
  delete process.env.BATTENBOOK_SMTP_URL;
});
afterAll(() => rmSync(folder, { recursive: true }));

test("without a mail server a mail is kept, with what was attached", async () => {
  expect(await sendMail(mail, at)).toEqual({ ok: true, value: "kept" });
  expect(keptMails()).toMatchObject([{ to: "iris@class.example", subject: "Report 1", attachments: ["report.pdf"], at }]);
  const file = readdirSync(path.join(folder, "mail")).find((name) => name.endsWith("report.pdf"));
  expect(readFileSync(path.join(folder, "mail", file ?? ""), "utf8")).toBe("%PDF-1.7");
});

test("with one it is sent, and nothing is kept", async () => {
  const heard: string[] = [];
  const server = await listening(heard);
  const before = keptMails().length;
  process.env.BATTENBOOK_SMTP_URL = `smtp://localhost:${server.port}`;
  expect(await sendMail(mail, at)).toEqual({ ok: true, value: "sent" });
  await server.close();
  expect(heard).toHaveLength(1);
  expect(heard[0]).toContain("Subject: Report 1");
  expect(heard[0]).toContain("filename=report.pdf");
  expect(keptMails()).toHaveLength(before);
});

test("a mail server that can't be reached is a refusal with its reason", async () => {
  const server = await listening([]);
  await server.close();
  process.env.BATTENBOOK_SMTP_URL = `smtp://localhost:${server.port}`;
  expect(await sendMail(mail, at)).toMatchObject({
    ok: false,
    refusal: { type: "MailRefused", why: expect.stringContaining("ECONNREFUSED") },
  });
});

function listening(heard: string[]): Promise<{ port: number; close: () => Promise<void> }> {
  const server = new SMTPServer({
    authOptional: true,
    disabledCommands: ["STARTTLS"],
    onData: (stream, _session, done) => {
      let text = "";
      stream.on("data", (chunk) => {
        text += String(chunk);
      });
      stream.on("end", () => {
        heard.push(text);
        done();
      });
    },
  });
  return new Promise((resolve) => {
    const listener = server.listen(0, "localhost", () => {
      const address = listener.address();
      const close = () => new Promise<void>((closed) => server.close(closed));
      resolve({ port: typeof address === "object" && address ? address.port : 0, close });
    });
  });
}
