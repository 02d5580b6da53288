import path from "node:path";
import { importTable, packagesOfLib } from "./import-table";
import { type Finding, finding, type Source } from "./source";

type Import = { readonly from: string; readonly offset: number };

/** Every module a source names: import, export from, import(), the type import("…") and new URL("…", import.meta.url). */
export function importsOf(source: Source): readonly Import[] {
  return source.nodes.flatMap(({ node }) => {
    switch (node.type) {
      case "ImportDeclaration":
      case "ExportAllDeclaration":
      case "ExportNamedDeclaration":
      case "ImportExpression":
      case "TSImportType":
        return node.source?.type === "Literal" ? [{ from: String(node.source.value), offset: node.start }] : [];
      case "NewExpression": {
        const [first, second] = node.arguments;
        const isModuleUrl = first?.type === "Literal" && second?.type === "MemberExpression" && second.object.type === "MetaProperty";
        return isModuleUrl ? [{ from: String(first.value), offset: node.start }] : [];
      }
      default:
        return [];
    }
  });
}

/** The path inside the project that an import names, without its ending; null for a package. */
export function targetOf(importer: string, from: string): string | null {
  if (from.startsWith("@/")) return withoutEnding(from.slice(2));
  if (from.startsWith(".")) return withoutEnding(path.posix.join(path.posix.dirname(importer), from));
  return null;
}

/** The row of the table that a path belongs to; null for what the table does not rule (tests, configuration). */
export function partOf(file: string): string | null {
  const isHook = /^components\/.*\/use-[a-z0-9-]+(\.tsx?)?$/.test(file);
  if (isHook) return "components/use-*";
  const rows = importTable.map((row) => row.part).filter((part) => isInside(file, part));
  return rows.sort((a, b) => b.length - a.length)[0] ?? null;
}

export function forbiddenImports(source: Source): readonly Finding[] {
  const part = partOf(source.path);
  if (part === null) return [];
  return importsOf(source).flatMap(({ from, offset }) => {
    const target = targetOf(source.path, from);
    const why = target === null ? packageProblem(source, part, from) : projectProblem(part, target);
    return why === null ? [] : [finding(source, offset, why)];
  });
}

/** Folders and files that import each other in a circle, each circle once, from a map of imports. */
export function cyclesOf(graph: ReadonlyMap<string, ReadonlySet<string>>): readonly Finding[] {
  const cycles = new Set<string>();
  const done = new Set<string>();
  const visit = (node: string, trail: readonly string[]): void => {
    const at = trail.indexOf(node);
    if (at >= 0) cycles.add(trail.slice(at).concat(node).join(" → "));
    if (at >= 0 || done.has(node)) return;
    for (const next of graph.get(node) ?? []) visit(next, [...trail, node]);
    done.add(node);
  };
  for (const node of graph.keys()) visit(node, []);
  return [...cycles];
}

/** The map of imports between files or, with `nameOf`, between what they belong to. */
export function importGraph(sources: readonly Source[], nameOf: (file: string) => string | null): Map<string, Set<string>> {
  const graph = new Map<string, Set<string>>();
  for (const source of sources) {
    const from = nameOf(withoutEnding(source.path));
    if (from === null) continue;
    const targets = importsOf(source).map((each) => targetOf(source.path, each.from));
    const names = targets.flatMap((target) => (target === null ? [] : [nameOf(target)])).filter((name) => name !== null && name !== from);
    graph.set(from, new Set([...(graph.get(from) ?? []), ...names.filter((name) => name !== null)]));
  }
  return graph;
}

function projectProblem(part: string, target: string): string | null {
  const targetPart = partOf(target);
  if (targetPart === null || targetPart === part) return null;
  const allowed = importTable.find((row) => row.part === part)?.mayImport ?? [];
  const isAllowed = allowed.includes(targetPart) || (allowed.includes("lib/*") && targetPart.startsWith("lib"));
  return isAllowed ? null : `${part} must not import ${targetPart} (${target})`;
}

function packageProblem(source: Source, part: string, from: string): string | null {
  const name = packageOf(from);
  if (part.startsWith("lib")) return packagesOfLib.includes(name) ? null : `lib must not import the package ${name}`;
  if (["better-sqlite3", "drizzle-orm"].includes(name) && !part.startsWith("db"))
    return `${part} must not open the server's database (${name})`;
  if (name === "dexie" && part !== "db/device") return `${source.path} must not open the phone's database (${name})`;
  return null;
}

function packageOf(from: string): string {
  return from
    .split("/")
    .slice(0, from.startsWith("@") ? 2 : 1)
    .join("/");
}

function isInside(file: string, part: string): boolean {
  if (part === "lib") return /^lib\/[^/]+$/.test(file);
  return file === part || file === withoutEnding(part) || file.startsWith(`${part}/`);
}

function withoutEnding(file: string): string {
  return file.replace(/\.(ts|tsx|mjs|js)$/, "");
}
