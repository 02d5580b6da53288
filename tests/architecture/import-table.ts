/** One line of the table: a folder (or file), and what of the project it may import besides itself. */
export type TableRow = { readonly part: string; readonly mayImport: readonly string[] };

const method = ["lib", "lib/numerics", "lib/uncertainty", "lib/hydrostatics", "lib/inclining", "lib/lightship"];

/**
 * Imports run downhill. A part is named by the longest row that fits a file's path; `use-*` stands for hooks, `lib/*` for all of lib.
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
  { part: "lib/people", mayImport: ["lib"] },
  { part: "lib/spreadsheet", mayImport: ["lib"] },
  { part: "lib/sync", mayImport: [...method, "lib/record", "lib/ledger"] },
  { part: "lib/vessel", mayImport: [...method, "lib/record", "lib/spreadsheet"] },
  { part: "lib/report", mayImport: ["lib/*"] },
  { part: "db/schema", mayImport: ["lib/*"] },
  { part: "db/device", mayImport: ["lib/*"] },
  { part: "db/server", mayImport: ["lib/*", "db/schema"] },
  { part: "db/seed", mayImport: ["lib/*", "db/schema", "db/server"] },
  { part: "db/server/commands", mayImport: ["lib/*", "db/schema", "db/server", "db/seed"] },
  { part: "worker", mayImport: ["lib/*", "db/device"] },
  { part: "worker/reduce.ts", mayImport: ["lib/*"] },
  { part: "components", mayImport: ["lib/*", "components/use-*"] },
  { part: "components/use-*", mayImport: ["lib/*", "components", "worker", "db/device"] },
  { part: "app", mayImport: ["lib/*", "components", "components/use-*", "worker", "db/schema", "db/server"] },
  { part: "instrumentation.ts", mayImport: ["db/server"] },
];

/** The packages that the method may stand on: none of them knows a clock, a network or a machine. */
export const packagesOfLib: readonly string[] = ["zod", "@noble/hashes", "fflate", "saxes", "csv-parse"];
