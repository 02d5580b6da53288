import { integer, primaryKey, sqliteTable, text } from "drizzle-orm/sqlite-core";
import type { Role } from "@/lib/sync/job-sheet";
import { accounts } from "./accounts";
import { tests } from "./tests";

/** A phone, tablet or browser that makes events; `import` devices speak for files read in. */
export const devices = sqliteTable("devices", {
  id: text("id").primaryKey(),
  name: text("name").notNull(),
  account: text("account")
    .notNull()
    .references(() => accounts.id),
  /** public half of its signing key; null: its events are unsigned, and marked so */
  publicKey: text("public_key", { mode: "json" }).$type<Record<string, unknown>>(),
  enrolledAt: text("enrolled_at").notNull(),
  revokedAt: text("revoked_at"),
  lastHeardAt: text("last_heard_at"),
  /** events it says it still holds unsent */
  holds: integer("holds").notNull().default(0),
});

/** Everybody who ever held a device: what it says in another name is not theirs. */
export const deviceHolders = sqliteTable(
  "device_holders",
  {
    device: text("device")
      .notNull()
      .references(() => devices.id),
    account: text("account")
      .notNull()
      .references(() => accounts.id),
  },
  (table) => [primaryKey({ columns: [table.device, table.account] })],
);

/** A code that lets one phone in, once. Only its hash is kept. */
export const enrolmentCodes = sqliteTable("enrolment_codes", {
  id: text("id").primaryKey(),
  codeHash: text("code_hash").notNull().unique(),
  test: text("test")
    .notNull()
    .references(() => tests.id),
  role: text("role").$type<Role>().notNull(),
  personName: text("person_name").notNull(),
  /** the account it is for; null: one is made when the code is used */
  account: text("account").references(() => accounts.id),
  createdAt: text("created_at").notNull(),
  createdBy: text("created_by")
    .notNull()
    .references(() => accounts.id),
  expiresAt: text("expires_at").notNull(),
  revokedAt: text("revoked_at"),
  usedAt: text("used_at"),
  usedBy: text("used_by").references(() => devices.id),
});
