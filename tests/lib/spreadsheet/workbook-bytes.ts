import { strToU8, zipSync } from "fflate";
import { cellName } from "@/lib/spreadsheet/sheet";

/** A cell as a test writes it: words, a number, or the markup of the cell itself. */
export type Written = string | number | null | { readonly markup: string };

/** The bytes of a workbook with these sheets, parts and names as ECMA-376 has them. */
export function workbookBytes(sheets: Readonly<Record<string, readonly (readonly Written[])[]>>): Uint8Array {
  const names = Object.keys(sheets);
  const relations = names.map(
    (_, i) => `<Relationship Id="rId${i + 1}" Type="${relation}/worksheet" Target="worksheets/sheet${i + 1}.xml"/>`,
  );
  const listed = names.map((name, i) => `<sheet name="${escaped(name)}" sheetId="${i + 1}" r:id="rId${i + 1}"/>`);
  return zipSync({
    "xl/workbook.xml": strToU8(`<workbook xmlns="${main}" xmlns:r="${relation}"><sheets>${listed.join("")}</sheets></workbook>`),
    "xl/_rels/workbook.xml.rels": strToU8(`<Relationships xmlns="${packages}">${relations.join("")}</Relationships>`),
    "xl/styles.xml": strToU8(styles),
    "xl/sharedStrings.xml": strToU8(
      `<sst xmlns="${main}"><si><t>shared</t></si><si><r><t>in </t></r><r><t>parts</t></r><rPh><t>aside</t></rPh></si></sst>`,
    ),
    ...Object.fromEntries(names.map((name, i) => [`xl/worksheets/sheet${i + 1}.xml`, strToU8(sheetMarkup(sheets[name] ?? []))])),
  });
}

const main = "http://schemas.openxmlformats.org/spreadsheetml/2006/main";
const relation = "http://schemas.openxmlformats.org/officeDocument/2006/relationships";
const packages = "http://schemas.openxmlformats.org/package/2006/relationships";
/** Style 1 is a built-in date, 2 a day and month of one's own, 3 a length with its unit. */
const styles = `<styleSheet xmlns="${main}"><numFmts><numFmt numFmtId="164" formatCode="d\\ mmm"/><numFmt numFmtId="165" formatCode="0.00&quot; m, deck side&quot;"/></numFmts>
<cellStyleXfs><xf numFmtId="14"/></cellStyleXfs><cellXfs><xf numFmtId="0"/><xf numFmtId="14"/><xf numFmtId="164"/><xf numFmtId="165"/></cellXfs></styleSheet>`;

function sheetMarkup(rows: readonly (readonly Written[])[]): string {
  const lines = rows.map((row, i) => `<row r="${i + 1}">${row.map((cell, j) => cellMarkup(cell, cellName(i, j))).join("")}</row>`);
  return `<worksheet xmlns="${main}"><sheetData>${lines.join("")}</sheetData></worksheet>`;
}

function cellMarkup(cell: Written, name: string): string {
  if (cell === null) return "";
  if (typeof cell === "number") return `<c r="${name}"><v>${cell}</v></c>`;
  if (typeof cell === "string") return `<c r="${name}" t="inlineStr"><is><t>${escaped(cell)}</t></is></c>`;
  return cell.markup.replace("<c", `<c r="${name}"`);
}

function escaped(text: string): string {
  return text.replaceAll("&", "&amp;").replaceAll("<", "&lt;").replaceAll('"', "&quot;");
}
