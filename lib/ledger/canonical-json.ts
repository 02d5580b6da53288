/**
 * The one text of a JSON value: members sorted by UTF-16 code units, no white space, numbers as ECMAScript writes them.
 *
 * Refused by throwing, since only our own code hands values in: what JSON cannot hold (NaN, infinities, undefined,
 * functions, lone surrogates), because two programs would not agree on its bytes.
 *
 * Source: RFC 8785, JSON Canonicalization Scheme, §3.2.
 */
export function canonicalJson(value: unknown): string {
  if (value === null || typeof value === "boolean") return String(value);
  if (typeof value === "number") return canonicalNumber(value);
  if (typeof value === "string") return canonicalString(value);
  if (Array.isArray(value)) return `[${value.map(canonicalJson).join(",")}]`;
  if (typeof value === "object") return canonicalObject(value as Record<string, unknown>);
  throw new TypeError(`JSON cannot hold ${typeof value}`);
}

function canonicalObject(value: Record<string, unknown>): string {
  const members = Object.keys(value)
    .filter((name) => value[name] !== undefined)
    .sort(byCodeUnits)
    .map((name) => `${canonicalString(name)}:${canonicalJson(value[name])}`);
  return `{${members.join(",")}}`;
}

function canonicalNumber(value: number): string {
  if (!Number.isFinite(value)) throw new RangeError(`JSON cannot hold ${value}`);
  return JSON.stringify(value);
}

function canonicalString(value: string): string {
  if (!value.isWellFormed()) throw new RangeError("JSON cannot hold half a surrogate pair");
  return JSON.stringify(value);
}

function byCodeUnits(a: string, b: string): number {
  if (a === b) return 0;
  return a < b ? -1 : 1;
}
