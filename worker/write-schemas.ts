import { mkdirSync, writeFileSync } from "node:fs";
import { jsonSchemas } from "@/lib/report/json-schemas";

/** Writes the published schemas anew, after a change of the formats: `npm run schemas`. */
const folder = "public/schema";
mkdirSync(folder, { recursive: true });
for (const [file, schema] of Object.entries(jsonSchemas())) writeFileSync(`${folder}/${file}`, `${JSON.stringify(schema, null, 2)}\n`);
