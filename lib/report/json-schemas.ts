import { z } from "zod";
import { testRecordSchema } from "@/lib/record/test-record";
import { resultSchema } from "./result-schema";

/**
 * The formats of record and result as JSON Schema, by the name of the file in which each is served: anybody can check a file
 * without this program. Source: JSON Schema, draft 2020-12.
 */
export function jsonSchemas(): Readonly<Record<string, object>> {
  return {
    "test-record.v1.json": z.toJSONSchema(testRecordSchema, { io: "input" }),
    "test-result.v1.json": z.toJSONSchema(resultSchema),
  };
}
