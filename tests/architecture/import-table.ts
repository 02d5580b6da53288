/** One line of the table: a folder (or file), and what of the project it may import besides itself. */
export type TableRow = { readonly part: string; readonly mayImport: readonly string[] };

const method = ["lib", "lib/numerics", "lib/hydrostatics", "lib/inclining", "lib/lightship", "lib/uncertainty"];
const exchange = ["lib/record", "lib/ledger", "lib/sync"];
const wholeLib = [...method, ...exchange, "lib/report"];

/**
 * Imports run downhill. A part is named by the longest row that fits a file's path; `use-*` stands for hooks.
 * DEVELOPERS.md prints this table, and a test compares the two.
 */
export const importTable: readonly TableRow[] = [
  { part: "lib", mayImport: [] },
  { part: "lib/numerics", mayImport: ["lib"] },
  { part: "lib/uncertainty", mayImport: ["lib", "lib/numerics"] },
  { part: "lib/hydrostatics", mayImport: ["lib", "lib/numerics"] },
  { part: "lib/inclining", mayImport: ["lib", "lib/numerics", "lib/uncertainty", "lib/hydrostatics"] },
  { part: "lib/lightship", mayImport: ["lib", "lib/numerics", "lib/uncertainty", "lib/hydrostatics", "lib/inclining"] },
  { part: "lib/record", mayImport: method },
  { part: "lib/ledger", mayImport: ["lib"] },
  { part: "lib/sync", mayImport: [...method, "lib/record", "lib/ledger"] },
  { part: "lib/report", mayImport: [...method, ...exchange] },
  { part: "db/schema", mayImport: wholeLib },
  { part: "db/device", mayImport: wholeLib },
  { part: "db/server", mayImport: [...wholeLib, "db/schema"] },
  { part: "db/seed", mayImport: [...wholeLib, "db/schema", "db/server"] },
  { part: "db/server/commands", mayImport: [...wholeLib, "db/schema", "db/server", "db/seed"] },
  { part: "worker", mayImport: [...wholeLib, "db/device"] },
  { part: "worker/reduce.ts", mayImport: wholeLib },
  { part: "components", mayImport: [...wholeLib, "components/use-*"] },
  { part: "components/use-*", mayImport: [...wholeLib, "components", "worker", "db/device"] },
  { part: "app", mayImport: [...wholeLib, "components", "components/use-*", "worker", "db/schema", "db/server"] },
];

/** The packages that the method may stand on: neither knows a clock, a network or a machine. */
export const packagesOfLib: readonly string[] = ["zod", "@noble/hashes"];
