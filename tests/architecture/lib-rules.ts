import { type Finding, finding, type Node, nodesOfType, type Placed, type Source } from "./source";

/** What knows the time, the place, chance or the audience: the method is given these, and never asks. */
const worldly = new Set([
  ...["window", "document", "navigator", "localStorage", "sessionStorage", "indexedDB", "caches", "self", "location"],
  ...["fetch", "XMLHttpRequest", "WebSocket", "EventSource", "crypto", "performance", "console", "globalThis"],
  ...["process", "Buffer", "setTimeout", "setInterval", "queueMicrotask", "requestAnimationFrame", "require"],
]);

/** Clock, chance, browser and machine inside lib. */
export function worldlyNames(source: Source): readonly Finding[] {
  if (!source.path.startsWith("lib/")) return [];
  const own = declaredNames(source);
  const names = source.nodes.flatMap(({ node, parent }) =>
    node.type === "Identifier" && worldly.has(node.name) && !own.has(node.name) && isReference(node, parent)
      ? [finding(source, node.start, `lib must not know ${node.name}`)]
      : [],
  );
  return [...names, ...clockAndChance(source)];
}

/** Digits are chosen in one place. */
export function roundingElsewhere(source: Source): readonly Finding[] {
  const isRuled = /^(lib|db|worker|components|app)\//.test(source.path) && !source.path.startsWith("lib/report/");
  if (!isRuled) return [];
  const rounding = new Set(["toFixed", "toPrecision", "toExponential", "toLocaleString", "NumberFormat"]);
  return nodesOfType(source, "MemberExpression").flatMap((node) =>
    node.property.type === "Identifier" && rounding.has(node.property.name)
      ? [finding(source, node.property.start, `${node.property.name} outside lib/report`)]
      : [],
  );
}

/** Every function that lib offers says what its result is. */
export function undocumentedFunctions(source: Source): readonly Finding[] {
  return exportedFunctions(source)
    .filter((node) => docCommentOf(source, node.start) === null)
    .map((node) => finding(source, node.start, "an exported function without a doc comment"));
}

/** A formula in a doc comment stands beside its source, or says that it is a definition. */
export function formulasWithoutSource(source: Source): readonly Finding[] {
  return exportedFunctions(source).flatMap((node) => {
    const comment = docCommentOf(source, node.start) ?? "";
    const hasFormula = /^\s*\* {3,}\S.*[=≈]/m.test(comment);
    const hasSource = /Source:|definition|common practice|from memory/i.test(comment);
    return hasFormula && !hasSource ? [finding(source, node.start, "a formula without its source")] : [];
  });
}

function clockAndChance(source: Source): readonly Finding[] {
  const members = nodesOfType(source, "MemberExpression").flatMap((node) => {
    const name =
      node.object.type === "Identifier" && node.property.type === "Identifier" ? `${node.object.name}.${node.property.name}` : "";
    return ["Date.now", "Math.random"].includes(name) ? [finding(source, node.start, `lib must not ask ${name}`)] : [];
  });
  const dates = nodesOfType(source, "NewExpression").filter(
    (node) => node.callee.type === "Identifier" && node.callee.name === "Date" && node.arguments.length === 0,
  );
  return [...members, ...dates.map((node) => finding(source, node.start, "lib must not ask new Date()"))];
}

function isReference(node: Node, parent: Placed["parent"]): boolean {
  if (parent === null || parent.type.startsWith("TS")) return false;
  if (parent.type === "MemberExpression") return parent.object === node || parent.computed;
  if (parent.type === "Property") return parent.value === node || parent.computed;
  return !["PropertyDefinition", "MethodDefinition", "ImportSpecifier", "ExportSpecifier", "LabeledStatement"].includes(parent.type);
}

function declaredNames(source: Source): ReadonlySet<string> {
  const names = source.nodes.flatMap(({ node, parent }) => (node.type === "Identifier" && isDeclaration(node, parent) ? [node.name] : []));
  return new Set(names);
}

function isDeclaration(node: Node, parent: Placed["parent"]): boolean {
  switch (parent?.type) {
    case "VariableDeclarator":
      return parent.id === node;
    case "FunctionDeclaration":
    case "FunctionExpression":
    case "ArrowFunctionExpression":
      return parent.body !== node;
    case "Property":
    case "AssignmentPattern":
    case "ArrayPattern":
      return false;
    default:
      return parent?.type.startsWith("Import") ?? false;
  }
}

function exportedFunctions(source: Source): readonly Node[] {
  if (!source.path.startsWith("lib/")) return [];
  return source.program.body.filter((node) => node.type === "ExportNamedDeclaration" && isFunctionDeclaration(node.declaration));
}

function isFunctionDeclaration(declaration: Node | null): boolean {
  if (declaration?.type === "FunctionDeclaration") return true;
  if (declaration?.type !== "VariableDeclaration") return false;
  return declaration.declarations.some((each) => each.init?.type === "ArrowFunctionExpression" || each.init?.type === "FunctionExpression");
}

function docCommentOf(source: Source, offset: number): string | null {
  const comment = source.comments.findLast((each) => each.end <= offset && source.text.slice(each.end, offset).trim() === "");
  return comment?.type === "Block" && comment.value.startsWith("*") ? comment.value : null;
}
