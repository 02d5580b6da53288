import { randomBytes } from "node:crypto";
import { existsSync, readFileSync, writeFileSync } from "node:fs";
import path from "node:path";
import { dataFolder } from "./data-folder";

/** The secret that sessions are sealed with: made at the first start and kept beside the database, for its owner alone. */
export function sessionSecret(): string {
  if (process.env.NEXTAUTH_SECRET) return process.env.NEXTAUTH_SECRET;
  const file = path.join(dataFolder(), "session-secret");
  if (!existsSync(file)) writeIfNew(file, randomBytes(32).toString("base64url"));
  return readFileSync(file, "utf8").trim();
}

// two processes may start at once: the first to write wins, both read the same
function writeIfNew(file: string, secret: string): void {
  try {
    writeFileSync(file, `${secret}\n`, { mode: 0o600, flag: "wx", flush: true });
  } catch (error) {
    if ((error as NodeJS.ErrnoException).code !== "EEXIST") throw error;
  }
}
