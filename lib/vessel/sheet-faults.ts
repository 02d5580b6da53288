import type { HullRefusal } from "@/lib/hydrostatics/hull";
import type { TankRefusal } from "@/lib/hydrostatics/tank";
import type { NumberRefusal } from "@/lib/spreadsheet/number-in-cell";
import type { CellPlace } from "@/lib/spreadsheet/sheet";
import type { Limit } from "./sheet-field";

/** What keeps a sheet from being taken; each names the cell. The sheet's name is empty where it was typed by hand. */
export type SheetFault =
  | (NumberRefusal & InColumn)
  | (CellPlace & { readonly type: "ColumnMissing"; readonly column: string })
  | (CellPlace & { readonly type: "RowsMissing"; readonly got: number; readonly needed: number })
  | (InColumn & { readonly type: "OutOfLimits"; readonly value: number; readonly limit: Limit })
  | (InColumn & { readonly type: "OutOfOrder"; readonly value: number; readonly before: number; readonly order: "rise" | "fall" })
  | (InColumn & { readonly type: "NotAbove"; readonly value: number; readonly other: string; readonly than: number })
  | (InColumn & { readonly type: "TooManyWords"; readonly got: number; readonly most: number })
  | (CellPlace & { readonly type: "RepeatedInSheet"; readonly what: string; readonly first: string })
  | (CellPlace & { readonly type: "SectionInTwoPlaces"; readonly x: number; readonly first: string })
  | (CellPlace & { readonly type: "HullInSheet"; readonly because: HullRefusal })
  | (CellPlace & { readonly type: "TankInSheet"; readonly because: TankRefusal });

export type InColumn = CellPlace & { readonly column: string };
