import path from "node:path";
import type { TextFile } from "./project";
import { type Finding, finding, linesOf, nodesOfType, type Source } from "./source";

const longestFile = 250;
const longestFunction = 60;
const longestPage = 25;
const namesThatSayNothing = ["utils", "util", "helpers", "helper", "misc", "common", "shared", "index"];

/** A file a person reads in one go, downwards. */
export function fileTooLong(file: TextFile): readonly Finding[] {
  const lines = file.text.trimEnd().split("\n").length;
  const isPage = /^app\/(.*\/)?page\.tsx$/.test(file.path);
  const limit = isPage ? longestPage : longestFile;
  return lines > limit ? [finding(file, 0, `has ${lines} lines, more than ${limit}`)] : [];
}

/** A function that fits on a screen; what `describe` holds is a chapter, not a function. */
export function functionsTooLong(source: Source): readonly Finding[] {
  const functions = source.nodes.filter(({ node, parent }) => isFunction(node.type) && !isChapter(parent));
  return functions.flatMap(({ node }) => {
    const lines = linesOf(source, node);
    return lines > longestFunction ? [finding(source, node.start, `a function of ${lines} lines, more than ${longestFunction}`)] : [];
  });
}

/** Names in kebab-case that say what is inside; Next's [brackets] and (groups) are its own. */
export function badFileName(file: { readonly path: string }): readonly Finding[] {
  const segments = file.path.split("/").filter((segment) => !segment.startsWith("."));
  const isAtRoot = segments.length === 1;
  return segments.flatMap((segment) => {
    const [name = ""] = segment.split(".");
    const bare = segment.replace(/^[[(](\.\.\.)?(.*)[\])]$/, "$2");
    if (namesThatSayNothing.includes(name)) return [`${file.path} "${name}" says nothing about what is inside`];
    const isKebab = /^[a-z0-9]+(-[a-z0-9]+)*(\.[a-z0-9]+(-[a-z0-9]+)*)*$/.test(bare);
    const isCustom = isAtRoot && /^[A-Z]+\.md$/.test(segment);
    return isKebab || isCustom ? [] : [`${file.path} "${segment}" is not in kebab-case`];
  });
}

/** Default exports hide the name of what they export: only Next's files and configuration need them. */
export function defaultExports(source: Source): readonly Finding[] {
  const mayHave =
    source.path.startsWith("app/") || /\.config\.[a-z]+$/.test(source.path) || /^(proxy|instrumentation)\.ts$/.test(source.path);
  if (mayHave) return [];
  const direct = nodesOfType(source, "ExportDefaultDeclaration");
  const renamed = nodesOfType(source, "ExportSpecifier").filter(
    (node) => node.exported.type === "Identifier" && node.exported.name === "default",
  );
  return [...direct, ...renamed].map((node) => finding(source, node.start, "a default export"));
}

/** "use client" stands at the top of the components that need it, and never in app/ but in error.tsx, where Next insists. */
export function misplacedUseClient(source: Source): readonly Finding[] {
  const marks = nodesOfType(source, "Literal").filter((node) => node.value === "use client");
  const isAtTop = (offset: number) => offset === source.program.body[0]?.start;
  return marks.flatMap((node) => {
    const isDemandedByNext = /^app\/(.*\/)?(global-)?error\.tsx$/.test(source.path);
    if (source.path.startsWith("app/") && !isDemandedByNext) return [finding(source, node.start, '"use client" in app/')];
    return source.path.startsWith("tests/") || isAtTop(node.start) ? [] : [finding(source, node.start, '"use client" is not at the top')];
  });
}

/** No type that turns checking off, and no comment that silences a tool. */
export function silencedChecks(source: Source): readonly Finding[] {
  const anys = nodesOfType(source, "TSAnyKeyword").map((node) => finding(source, node.start, "the type any"));
  const silencer = /\b(biome|eslint|ts|prettier|oxlint)-(ignore|expect-error|nocheck|disable)|\bc8 ignore|\bistanbul ignore/;
  const comments = source.comments.filter((comment) => silencer.test(comment.value));
  return [...anys, ...comments.map((comment) => finding(source, comment.start, "a comment that silences a check"))];
}

/** kg and km are units to every reader, and centres of gravity and metacentres to this one: the names are spelled out. */
export function ambiguousNames(source: Source): readonly Finding[] {
  const names = nodesOfType(source, "Identifier").filter((node) => /^(kg|km)$/i.test(node.name));
  return names.map((node) => finding(source, node.start, `the name ${node.name}: say vcg, kmt or kml`));
}

/** The two doors say on which side they stand: the file that opens the server's or the phone's database. */
export function unmarkedDoor(source: Source): readonly Finding[] {
  const doors = [
    { folder: "db/server/", opens: "better-sqlite3", mark: "server-only" },
    { folder: "db/device/", opens: "dexie", mark: "client-only" },
  ];
  return doors.flatMap(({ folder, opens, mark }) => {
    if (!source.path.startsWith(folder)) return [];
    const imports = nodesOfType(source, "ImportDeclaration");
    const opened = imports.find((node) => node.source.value === opens && node.importKind !== "type");
    if (!opened || imports.some((node) => node.source.value === mark)) return [];
    return [finding(source, opened.start, `opens ${opens} without importing "${mark}"`)];
  });
}

function isFunction(type: string): boolean {
  return type === "FunctionDeclaration" || type === "FunctionExpression" || type === "ArrowFunctionExpression";
}

function isChapter(parent: Source["nodes"][number]["parent"]): boolean {
  return parent?.type === "CallExpression" && parent.callee.type === "Identifier" && parent.callee.name === "describe";
}

/** The folder names that may stand at the root. */
export function unexpectedAtRoot(paths: readonly string[], expected: readonly string[]): readonly Finding[] {
  const tops = new Set(paths.map((file) => file.split(path.posix.sep)[0] ?? file));
  return [...tops].filter((top) => !top.startsWith(".") && !expected.includes(top)).map((top) => `${top} at the root is not expected`);
}
