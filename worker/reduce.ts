import { readFileSync } from "node:fs";
import { faultsOf } from "@/lib/inclining/faults";
import { type IncliningResult, incliningResult } from "@/lib/lightship/inclining-result";
import { parseRecord } from "@/lib/record/parse-record";
import { refusalLine } from "@/lib/report/refusal-sentence";
import { resultPage } from "@/lib/report/result-page";

const usage = "usage: reduce [--table] RECORD.json";

const options = process.argv.slice(2);
const isTable = options.includes("--table");
const [file, ...others] = options.filter((option) => option !== "--table");

if (file === undefined || others.length > 0 || file.startsWith("--")) stop([usage]);
else reduceFile(file);

/** Nothing but the record is read, and nothing but its result is printed. */
function reduceFile(path: string): void {
  const text = textOf(path);
  if (text === null) return stop([`${path}: no such file can be read`]);
  const record = parseRecord(text);
  const result = record.ok ? incliningResult(record.value) : record;
  if (!result.ok) return stop(faultsOf(result).map(refusalLine));
  process.stdout.write(isTable ? pageOf(result.value) : `${JSON.stringify(result.value, null, 2)}\n`);
}

function textOf(path: string): string | null {
  try {
    return readFileSync(path, "utf8");
  } catch {
    return null;
  }
}

function pageOf(result: IncliningResult): string {
  return `${resultPage(result).join("\n")}\n`;
}

function stop(lines: readonly string[]): void {
  process.stderr.write(`${lines.join("\n")}\n`);
  process.exitCode = 2;
}
