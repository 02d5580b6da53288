import { readFileSync } from "node:fs";
import { expect, test } from "vitest";
import { jsonSchemas } from "@/lib/report/json-schemas";

test.each(Object.entries(jsonSchemas()))("public/schema/%s is what the program reads and writes now", (file, schema) => {
  expect(JSON.parse(readFileSync(`public/schema/${file}`, "utf8"))).toEqual(JSON.parse(JSON.stringify(schema)));
});

test("name what a record must hold, and allow nothing else", () => {
  const record = jsonSchemas()["test-record.v1.json"] as { required: string[]; additionalProperties: boolean };
  expect(record.required).toEqual(expect.arrayContaining(["format", "version", "vessel", "hydrostatics", "readings"]));
  expect(record.additionalProperties).toBe(false);
});
