/** What a file is by its first bytes, whatever its name says. */
export type FileKind = "workbook" | "text" | OtherKind;
export type OtherKind = "old-workbook" | "program" | "pdf" | "picture" | "web-page" | "unreadable";

/**
 * The kind of a file by its first bytes.
 *
 * A zip archive may be a workbook; a compound file is a workbook of the older kind or one behind a password; what holds
 * a zero byte and does not begin as UTF-16 text is no text.
 *
 * Source: PKWARE APPNOTE 4.3.7 (zip), [MS-CFB] 2.2 (compound file), ISO 32000-1 7.5.2 (PDF), W3C PNG 5.2, JFIF 1.02,
 * ELF and PE headers (from memory).
 */
export function fileKind(bytes: Uint8Array): FileKind {
  const known = signatures.find(({ starts }) => starts.every((byte, i) => bytes[i] === byte));
  if (known) return known.kind;
  if (!isUtf16(bytes) && bytes.subarray(0, 4096).includes(0)) return "unreadable";
  const opening = new TextDecoder("latin1").decode(bytes.subarray(0, 256)).trimStart().toLowerCase();
  return /^(ï»¿)?<(!doctype|html|\?xml|table)/.test(opening) ? "web-page" : "text";
}

/** Whether a text begins with the mark of UTF-16. */
export function isUtf16(bytes: Uint8Array): boolean {
  return (bytes[0] === 0xff && bytes[1] === 0xfe) || (bytes[0] === 0xfe && bytes[1] === 0xff);
}

const signatures: readonly { readonly kind: FileKind; readonly starts: readonly number[] }[] = [
  { kind: "workbook", starts: [0x50, 0x4b, 0x03, 0x04] },
  { kind: "old-workbook", starts: [0xd0, 0xcf, 0x11, 0xe0, 0xa1, 0xb1, 0x1a, 0xe1] },
  { kind: "program", starts: [0x4d, 0x5a] },
  { kind: "program", starts: [0x7f, 0x45, 0x4c, 0x46] },
  { kind: "pdf", starts: [0x25, 0x50, 0x44, 0x46] },
  { kind: "picture", starts: [0x89, 0x50, 0x4e, 0x47] },
  { kind: "picture", starts: [0xff, 0xd8, 0xff] },
];
