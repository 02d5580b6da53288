import { loadDemo } from "@/db/seed/demo";
import { demoPassword, demoPeople } from "@/db/seed/demo-people";
import { accountById } from "../accounts";
import { type Database, database } from "../connection";

/** Fills an empty database with the demo, and tells a person how to sign in: one line for each account. */
const db = database();
const loaded = await loadDemo(db);
if (loaded.ok) console.log("The database was empty: MV Skerry Tern and the first half of her test are aboard.\n");
console.log(accountsInLines(db));
db.$client.close();

function accountsInLines(db: Database): string {
  const people = Object.values(demoPeople).filter(({ id }) => accountById(db, id)?.closedAt === null);
  if (people.length === 0) return "The database was in use before: sign in with your own account.";
  return people.map(({ role, email }) => `  ${role.padEnd(15)}${email.padEnd(25)}${demoPassword}`).join("\n");
}
