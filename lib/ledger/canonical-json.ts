/**
 * The one text of a JSON value: members sorted by UTF-16 code units, no white space, numbers as ECMAScript writes them.
 *
 * Refused by throwing, since only our own code hands values in: what JSON cannot hold (NaN, infinities, undefined, gaps
 * in lists, functions, dates and other objects with a nature of their own, lone surrogates), because two programs would
 * not agree on its bytes. A member of an object that is undefined is left out, as ECMAScript's own JSON does.
 *
 * Source: RFC 8785, JSON Canonicalization Scheme, §3.2.
 */
export function canonicalJson(value: unknown): string {
  if (value === null || typeof value === "boolean") return String(value);
  if (typeof value === "number") return canonicalNumber(value);
  if (typeof value === "string") return canonicalString(value);
  // Array.from visits gaps, which map would pass over
  if (Array.isArray(value)) return `[${Array.from(value, (item) => canonicalJson(item)).join(",")}]`;
  if (typeof value === "object") return canonicalObject(value as Record<string, unknown>);
  throw new TypeError(`JSON cannot hold ${typeof value}`);
}

function canonicalObject(value: Record<string, unknown>): string {
  if (!isPlain(value)) throw new TypeError(`JSON cannot hold a ${value.constructor?.name ?? "thing"} without losing what it is`);
  const members = Object.keys(value)
    .filter((name) => value[name] !== undefined)
    .sort(byCodeUnits)
    .map((name) => `${canonicalString(name)}:${canonicalJson(value[name])}`);
  return `{${members.join(",")}}`;
}

// what stands on nothing or directly on the root of all objects, of whichever window or worker
function isPlain(value: object): boolean {
  const above = Object.getPrototypeOf(value);
  return above === null || Object.getPrototypeOf(above) === null;
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
