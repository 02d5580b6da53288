import type { SheetFault } from "./sheet-faults";
import type { SheetRow } from "./sheet-rows";

type Ordered = { readonly key: string; readonly column: string; readonly order: "rise" | "fall"; readonly mayStay?: boolean };

/** The rows in which a column goes the other way than from row to row it must. */
export function outOfOrder(sheet: string, rows: readonly SheetRow[], { key, column, order, mayStay = false }: Ordered): SheetFault[] {
  return rows.flatMap((row, i) => {
    const [value, before] = [row.numbers[key], rows[i - 1]?.numbers[key]];
    if (value === undefined || before === undefined) return [];
    const step = order === "rise" ? value - before : before - value;
    if (step > 0 || (step === 0 && mayStay)) return [];
    return [{ type: "OutOfOrder" as const, sheet, cell: row.cellOf(key), column, value, before, order }];
  });
}

/** The second and every later row that has the same numbers in the columns named. */
export function repeatedRows(sheet: string, rows: readonly SheetRow[], keys: readonly string[], what: string): SheetFault[] {
  const first = new Map<string, string>();
  const last = keys.at(-1) as string;
  return rows.flatMap(({ numbers, cellOf }) => {
    const name = keys.map((key) => numbers[key] ?? 0).join(" ");
    const before = first.get(name);
    if (before === undefined) first.set(name, cellOf(last));
    return before === undefined ? [] : [{ type: "RepeatedInSheet" as const, sheet, cell: cellOf(last), what, first: before }];
  });
}
