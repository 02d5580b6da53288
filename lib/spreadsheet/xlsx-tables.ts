import { walkXml } from "./xml-elements";

/** The words of a workbook, which its cells name by number; what tells the pronunciation of a word is left out. Source: ECMA-376 part 1, 18.4. */
export function sharedWords(bytes: Uint8Array | undefined): readonly string[] {
  const words: string[] = [];
  let [isText, isAside] = [false, false];
  if (!bytes) return words;
  walkXml(bytes, {
    opened: (name) => {
      if (name === "si") words.push("");
      isText = name === "t";
      if (name === "rPh") isAside = true;
    },
    text: (text) => {
      if (isText && !isAside) words[words.length - 1] += text;
    },
    closed: (name) => {
      isText = false;
      if (name === "rPh") isAside = false;
    },
  });
  return words;
}

/**
 * The cell styles that show a number as a date or a time of day.
 * Source: ECMA-376 part 1, 18.8.30 (numFmt) with its list of built-in formats, 18.8.31 (codes).
 */
export function dateStyles(bytes: Uint8Array | undefined): ReadonlySet<number> {
  const ownFormats = new Map<number, string>();
  const formats: number[] = [];
  let isCellFormats = false;
  if (!bytes) return new Set();
  walkXml(bytes, {
    opened: (name, { numFmtId = "0", formatCode = "" }) => {
      if (name === "numFmt") ownFormats.set(Number(numFmtId), formatCode);
      if (name === "cellXfs") isCellFormats = true;
      if (name === "xf" && isCellFormats) formats.push(Number(numFmtId));
    },
    closed: (name) => {
      if (name === "cellXfs") isCellFormats = false;
    },
  });
  return new Set(formats.flatMap((format, style) => (isDateFormat(format, ownFormats.get(format)) ? [style] : [])));
}

function isDateFormat(id: number, code: string | undefined): boolean {
  if (code === undefined) return (id >= 14 && id <= 22) || (id >= 27 && id <= 36) || (id >= 45 && id <= 47) || (id >= 50 && id <= 58);
  const bare = code.replaceAll(/"[^"]*"|\\.|_.|\*./g, "").replaceAll(/\[(?!(h+|m+|s+)\])[^\]]*\]/gi, "");
  return /[ymdhs]/i.test(bare.replaceAll(/general/gi, ""));
}
