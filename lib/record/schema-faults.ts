import type { z } from "zod";
import { documentPath, valueAtPath } from "./document-path";
import { notNumbers } from "./json-document";
import type { NotAsNeeded, RecordFault } from "./record-faults";

type Issue = z.core.$ZodIssue;
type Segments = readonly PropertyKey[];

/** The faults behind what the schema did not accept, each with its place and with what stands there. */
export function schemaFaults(document: unknown, issues: readonly Issue[]): readonly RecordFault[] {
  return issues.flatMap((issue) => faultsOfIssue(document, issue, []));
}

function faultsOfIssue(document: unknown, issue: Issue, within: Segments): readonly RecordFault[] {
  const segments = [...within, ...issue.path];
  if (issue.code === "unrecognized_keys") {
    return issue.keys.map((key) => ({ type: "UnknownKey", key, path: documentPath([...segments, key]) }));
  }
  if (issue.code === "invalid_union" && issue.errors.length > 0) return faultsOfNearest(document, issue.errors, segments);
  return [notAsNeeded(document, segments, neededBy(issue))];
}

/** Of several shapes the one that the document comes nearest to; where it comes near to none, what any of them needs. */
function faultsOfNearest(document: unknown, shapes: readonly (readonly Issue[])[], segments: Segments): readonly RecordFault[] {
  const nearest = Math.min(...shapes.map((issues) => issues.length));
  const near = shapes.filter((issues) => issues.length === nearest);
  const isNone = shapes.every((issues) => issues.some((issue) => isMissing(document, issue, segments)));
  if (isNone && near.length > 1) {
    const keys = shapes.map((issues) =>
      issues.filter((issue) => isMissing(document, issue, segments)).map(({ path }) => documentPath(path)),
    );
    return [notAsNeeded(document, segments, `one of ${keys.map((each) => each.join(" and ")).join(", ")}`)];
  }
  return (near[0] ?? []).flatMap((issue) => faultsOfIssue(document, issue, segments));
}

function isMissing(document: unknown, issue: Issue, within: Segments): boolean {
  return issue.code === "invalid_type" && valueAtPath(document, [...within, ...issue.path]) === undefined;
}

function notAsNeeded(document: unknown, segments: Segments, needed: string): NotAsNeeded {
  return { type: "NotAsNeeded", needed, given: inWords(valueAtPath(document, segments)), path: documentPath(segments) || "record" };
}

function neededBy(issue: Issue): string {
  switch (issue.code) {
    case "invalid_type":
      return withArticle(issue.expected === "int" ? "whole number" : issue.expected);
    case "invalid_value":
      return issue.values.map((value) => JSON.stringify(value)).join(" or ");
    case "too_small":
      return bound("at least", "above", issue.minimum, issue.origin, issue.inclusive);
    case "too_big":
      return bound("at most", "below", issue.maximum, issue.origin, issue.inclusive);
    case "invalid_format":
      return withArticle(formats[issue.format] ?? issue.format);
    case "invalid_union":
      return optionsOf(issue);
    case "invalid_key":
      return "a name as key";
    default:
      return issue.message;
  }
}

// the kinds that a discriminated union knows stand beside the declared shape of its issue
function optionsOf(issue: Issue): string {
  const options: unknown = Reflect.get(issue, "options");
  if (!Array.isArray(options)) return "one of the shapes that belong here";
  return options.map((option) => JSON.stringify(option)).join(" or ");
}

const formats: Readonly<Record<string, string>> = { uuid: "UUID", datetime: "time in ISO 8601, UTC", date: "date such as 2026-05-04" };

function bound(inclusively: string, exclusively: string, limit: number | bigint, origin: string, isInclusive = true): string {
  const word = isInclusive ? inclusively : exclusively;
  if (origin === "array") return `${word} ${limit} entries`;
  return origin === "string" ? `${word} ${limit} characters` : `a number ${word} ${limit}`;
}

function withArticle(noun: string): string {
  return /^[aeio]/.test(noun) ? `an ${noun}` : `a ${noun}`;
}

function inWords(value: unknown): string {
  if (value === undefined) return "nothing";
  if (typeof value === "string" && notNumbers.includes(value)) return value;
  if (Array.isArray(value)) return `${value.length} entries`;
  return typeof value === "object" && value !== null ? "an object" : JSON.stringify(value).slice(0, 80);
}
