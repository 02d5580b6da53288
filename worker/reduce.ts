import { readFileSync } from "node:fs";
import { faultsOf } from "@/lib/inclining/faults";
import { parseRecord } from "@/lib/record/parse-record";
import { refusalLine } from "@/lib/report/refusal-sentence";
import { type ResultDocument, wholeResult } from "@/lib/report/result-document";
import { resultPage } from "@/lib/report/result-page";

const usage = "usage: reduce [--table] RECORD.json";

const options = process.argv.slice(2);
const files = options.filter((option) => option !== "--table");

const printed = reduction(files, options.includes("--table"));
if (printed.ok) process.stdout.write(printed.page);
else {
  process.stderr.write(printed.faults.map((line) => `${line}\n`).join(""));
  process.exitCode = 2;
}

type Printed = { readonly ok: true; readonly page: string } | { readonly ok: false; readonly faults: readonly string[] };

/** What the command prints: the result of one record, or all that stands against it. */
function reduction([file, ...others]: readonly string[], isTable: boolean): Printed {
  if (file === undefined || others.length > 0 || file.startsWith("--")) return { ok: false, faults: [usage] };
  const text = textOf(file);
  if (text === null) return { ok: false, faults: [`${file}: no such file can be read`] };
  const record = parseRecord(text);
  const result = record.ok ? wholeResult(record.value) : record;
  if (!result.ok) return { ok: false, faults: faultsOf(result).map(refusalLine) };
  return { ok: true, page: isTable ? pageOf(result.value) : `${JSON.stringify(result.value, null, 2)}\n` };
}

function textOf(path: string): string | null {
  try {
    return readFileSync(path, "utf8");
  } catch {
    return null;
  }
}

function pageOf(result: ResultDocument): string {
  return `${resultPage(result).join("\n")}\n`;
}
