import type { NumberRefusal } from "@/lib/spreadsheet/number-in-cell";
import type { CellPlace } from "@/lib/spreadsheet/sheet";
import type { UploadRefusal } from "@/lib/spreadsheet/uploaded-sheets";
import type { InColumn, SheetFault } from "@/lib/vessel/sheet-faults";
import { floatingClauses } from "./floating-clauses";
import type { Clauses, FloatingRefusal } from "./known-refusal";
import { shortFigure } from "./rounding";

/** Why an uploaded file was not read. */
export const uploadClauses: Clauses<Exclude<UploadRefusal, { type: "SheetTooLarge" }>> = {
  FileTooLarge: ({ got, most }) => `the file has ${megabytes(got)}, and at most ${megabytes(most)} are taken`,
  EmptyFile: () => "the file is empty",
  NotASpreadsheet: ({ kind }) => `the file is ${kindsOfFile[kind]}; a workbook (.xlsx) or text with separated values (.csv) is needed`,
  NotAWorkbook: ({ holds }) => `the file is ${archives[holds]}; save the sheet as .xlsx or .csv`,
  BrokenWorkbook: ({ part }) => `the workbook is broken and can't be read (${part}); open it in the spreadsheet and save it again`,
  WorkbookUnpacksTooLarge: ({ got, most }) => `the workbook unpacks to ${megabytes(got)}, and at most ${megabytes(most)} are taken`,
  BrokenCsv: ({ line }) => `a quotation is opened and not closed by line ${line} of the file`,
};

/** What is wrong in a sheet; each clause begins with the sheet and the cell. */
export const sheetClauses: Clauses<SheetFault | Extract<UploadRefusal, { type: "SheetTooLarge" }>> = {
  SheetTooLarge: (fault) => at(fault, "the sheet goes on too far here; take the table out into a sheet of its own"),
  EmptyCell: (fault) => inColumn(fault, "nothing stands here, a value is needed"),
  NotANumber: (fault) => inColumn(fault, `“${fault.given}” is not a number`),
  OtherDecimalMark: (fault) => inColumn(fault, otherMark(fault)),
  FormulaCell: (fault) => inColumn(fault, `a formula stands here (${fault.formula.slice(0, 40)}); paste it as a value`),
  ErrorCell: (fault) => inColumn(fault, `the spreadsheet shows the error ${fault.error} here`),
  DateCell: (fault) => inColumn(fault, "a date stands here; the spreadsheet has made one of a number such as 2.5"),
  ColumnMissing: (fault) =>
    at(fault, `no column is named for “${fault.column}”; look whether this is the right sheet and its row of headings`),
  RowsMissing: (fault) =>
    at(fault, `${fault.got === 0 ? "no row" : `only ${fault.got} row`} of numbers from here on, at least ${fault.needed} needed`),
  OutOfLimits: (fault) => inColumn(fault, `${shortFigure(fault.value)} is not ${fault.limit === "above 0" ? "above 0" : "0 or more"}`),
  OutOfOrder: (fault) =>
    inColumn(fault, `${shortFigure(fault.value)} comes after ${shortFigure(fault.before)}, but must ${fault.order} from row to row`),
  NotAbove: (fault) => inColumn(fault, `${shortFigure(fault.value)} is not above ${fault.other}, ${shortFigure(fault.than)}`),
  TooManyWords: (fault) => inColumn(fault, `${fault.got} characters, at most ${fault.most} are kept`),
  RepeatedInSheet: (fault) => at(fault, `${fault.what} stands here again, first in ${fault.first}`),
  SectionInTwoPlaces: (fault) =>
    at(fault, `the section at x = ${shortFigure(fault.x)} m goes on here, but began in ${fault.first}; its points must stand together`),
  HullInSheet: (fault) => at(fault, clauseOf(fault.because)),
  TankInSheet: (fault) => at(fault, clauseOf(fault.because)),
};

function at({ sheet, cell }: CellPlace, what: string): string {
  return sheet === "" ? `cell ${cell}: ${what}` : `sheet “${sheet}”, cell ${cell}: ${what}`;
}

function inColumn(fault: InColumn, what: string): string {
  return at(fault, `${what} (${fault.column})`);
}

function otherMark({ given, mark }: Extract<NumberRefusal, { type: "OtherDecimalMark" }>): string {
  return `“${given}” has a ${mark === "point" ? "comma" : "point"}, but the numbers of this file are read with a decimal ${mark}`;
}

// the table pairs each type with its own clause; the pairing itself is beyond the checker
function clauseOf(refusal: FloatingRefusal): string {
  return (floatingClauses[refusal.type] as (refusal: FloatingRefusal) => string)(refusal);
}

function megabytes(bytes: number): string {
  return `${shortFigure(bytes / 1024 / 1024, 3)} MB`;
}

const kindsOfFile: Readonly<Record<Extract<UploadRefusal, { type: "NotASpreadsheet" }>["kind"], string>> = {
  "old-workbook": "a workbook of the older kind (.xls) or one with a password",
  program: "a program, whatever its name says",
  pdf: "a PDF document",
  picture: "a picture",
  "web-page": "a web page",
  unreadable: "neither a workbook nor text",
};

const archives: Readonly<Record<Extract<UploadRefusal, { type: "NotAWorkbook" }>["holds"], string>> = {
  document: "a text document or a presentation",
  "open-document": "an OpenDocument file",
  "binary-workbook": "a binary workbook (.xlsb)",
  other: "an archive without a workbook in it",
};
