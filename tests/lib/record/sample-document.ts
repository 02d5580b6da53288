import { skerryTern, skerryTernReadings } from "@/db/seed/skerry-tern";
import type { TestRecord } from "@/lib/record/test-record";

const whole: TestRecord = { ...skerryTern().record, readings: skerryTernReadings(3) };

/** A whole record, to be changed in a test: a copy of its own each time. */
export function sampleDocument(): TestRecord {
  return structuredClone(whole);
}

/** A whole record with one place set to something else; undefined takes the place out. */
export function documentWith(path: readonly (string | number)[], value: unknown): unknown {
  const document: unknown = sampleDocument();
  const last = path.at(-1) ?? "";
  const holder = path.slice(0, -1).reduce<unknown>((within, key) => Reflect.get(Object(within), key), document);
  if (value === undefined) Reflect.deleteProperty(Object(holder), last);
  else Reflect.set(Object(holder), last, value);
  return document;
}
