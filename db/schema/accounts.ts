import { sql } from "drizzle-orm";
import { check, index, integer, sqliteTable, text } from "drizzle-orm/sqlite-core";
import type { Role } from "@/lib/sync/job-sheet";
import { tests } from "./tests";

/** A person known to this server. Someone who only ever reads on an enrolled phone has neither e-mail nor password. */
export const accounts = sqliteTable("accounts", {
  id: text("id").primaryKey(),
  email: text("email").unique(),
  name: text("name").notNull(),
  passwordHash: text("password_hash"),
  isAdministrator: integer("is_administrator", { mode: "boolean" }).notNull().default(false),
  /** may make vessels and tests; becomes engineer of a test only by a grant */
  isEngineer: integer("is_engineer", { mode: "boolean" }).notNull().default(false),
  locale: text("locale").notNull().default("en"),
  /** stands in every session; raising it ends them all */
  sessionVersion: integer("session_version").notNull().default(1),
  createdAt: text("created_at").notNull(),
  closedAt: text("closed_at"),
});

/** Who held which role in which test, and when: an event is judged by the role its author held when it was captured. */
export const roleGrants = sqliteTable(
  "role_grants",
  {
    id: integer("id").primaryKey({ autoIncrement: true }),
    test: text("test")
      .notNull()
      .references(() => tests.id),
    account: text("account")
      .notNull()
      .references(() => accounts.id),
    role: text("role").$type<Role>().notNull(),
    fromAt: text("from_at").notNull(),
    untilAt: text("until_at"),
    grantedBy: text("granted_by").references(() => accounts.id),
  },
  (table) => [
    index("role_grants_of_account").on(table.account, table.test),
    check("role_grants_in_order", sql`${table.untilAt} is null or ${table.untilAt} >= ${table.fromAt}`),
  ],
);

/** A link by which its person sets a password, once. Only its hash is kept. */
export const passwordLinks = sqliteTable("password_links", {
  id: text("id").primaryKey(),
  tokenHash: text("token_hash").notNull().unique(),
  account: text("account")
    .notNull()
    .references(() => accounts.id),
  createdAt: text("created_at").notNull(),
  /** null: asked for by whoever gave the address */
  createdBy: text("created_by").references(() => accounts.id),
  expiresAt: text("expires_at").notNull(),
  usedAt: text("used_at"),
});
