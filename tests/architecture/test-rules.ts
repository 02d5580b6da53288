import { type Finding, finding, type Node, type NodeOf, nodesOfType, type Source } from "./source";

type Call = NodeOf<"CallExpression">;

/** A test that is skipped, planned or run alone proves nothing about the rest. */
export function unrunTests(source: Source): readonly Finding[] {
  const words = new Set(["skip", "only", "todo", "fixme", "fails", "fail", "skipIf", "runIf"]);
  return nodesOfType(source, "MemberExpression").flatMap((node) => {
    const isUnrun = node.property.type === "Identifier" && words.has(node.property.name) && isTestName(rootOf(node));
    return isUnrun ? [finding(source, node.start, "a test that does not run, or runs alone")] : [];
  });
}

/** A test that expects nothing can't fail. */
export function testsWithoutExpectation(source: Source): readonly Finding[] {
  const expecting = expectingNames(source);
  return testCalls(source)
    .filter((call) => !mentions(source, call, expecting))
    .map((call) => finding(source, call.start, "a test that expects nothing"));
}

/** A file of tests holds at least one. */
export function fileWithoutTests(source: Source): readonly Finding[] {
  return testCalls(source).length === 0 ? [finding(source, 0, "a test file without a test")] : [];
}

/** Two tests of one chapter with one title can't be told apart when one fails. */
export function repeatedTitles(source: Source): readonly Finding[] {
  const seen = new Set<string>();
  return testCalls(source).flatMap((call) => {
    const title = titleOf(source, call);
    if (!seen.has(title)) {
      seen.add(title);
      return [];
    }
    return [finding(source, call.start, `the title "${title}" stands twice`)];
  });
}

/** Our own modules are run, never imitated. */
export function mockedModules(source: Source): readonly Finding[] {
  return nodesOfType(source, "CallExpression").flatMap((call) => {
    const isMock = call.callee.type === "MemberExpression" && rootOf(call.callee) === "vi" && /^(do)?mock$/i.test(lastOf(call.callee));
    return isMock ? [finding(source, call.start, "a mocked module")] : [];
  });
}

function testCalls(source: Source): readonly Call[] {
  const modifiers = new Set(["", "each", "for", "concurrent", "sequential", "slow", "skip", "only", "fails"]);
  return nodesOfType(source, "CallExpression").filter((call) => {
    const isTest = ["test", "it"].includes(rootOf(call.callee)) && modifiers.has(lastOf(call.callee));
    return isTest && call.arguments.some((argument) => /Function/.test(argument.type));
  });
}

/** The chapters a test stands in, and its own title. */
function titleOf(source: Source, call: Call): string {
  const chapters = nodesOfType(source, "CallExpression").filter(
    (each) => rootOf(each.callee) === "describe" && each.start < call.start && each.end >= call.end,
  );
  return [...chapters, call].map(({ arguments: [title] }) => (title ? source.text.slice(title.start, title.end) : "")).join(" > ");
}

/** Names whose use is an expectation: the test library's own, and functions of the file that use one. */
function expectingNames(source: Source): ReadonlySet<string> {
  const names = new Set(["expect", "expectTypeOf", "assert"]);
  const imported = nodesOfType(source, "ImportSpecifier").map((node) => node.local.name);
  for (const name of imported) if (/^expect[A-Z]/.test(name)) names.add(name);
  for (let size = 0; size < names.size; ) {
    size = names.size;
    for (const node of source.nodes.map((each) => each.node)) {
      const name = functionName(node);
      if (name !== null && mentions(source, node, names)) names.add(name);
    }
  }
  return names;
}

function functionName(node: Node): string | null {
  if (node.type === "FunctionDeclaration") return node.id?.name ?? null;
  const isFunction = node.type === "VariableDeclarator" && node.init !== null && /Function/.test(node.init.type);
  return isFunction && node.id.type === "Identifier" ? node.id.name : null;
}

function mentions(source: Source, within: Node, names: ReadonlySet<string>): boolean {
  return nodesOfType(source, "CallExpression", within).some((call) => names.has(rootOf(call.callee)) || names.has(lastOf(call.callee)));
}

function isTestName(name: string): boolean {
  return ["test", "it", "describe"].includes(name);
}

/** The first name of a chain: `test` in `test.each(rows)(…)`. */
function rootOf(node: Node): string {
  if (node.type === "Identifier") return node.name;
  if (node.type === "MemberExpression") return rootOf(node.object);
  if (node.type === "CallExpression") return rootOf(node.callee);
  return node.type === "TaggedTemplateExpression" ? rootOf(node.tag) : "";
}

/** The last name of a chain that has one: `each` in `test.each(rows)(…)`. */
function lastOf(node: Node): string {
  if (node.type === "MemberExpression") return node.property.type === "Identifier" ? node.property.name : "";
  if (node.type === "CallExpression") return lastOf(node.callee);
  return node.type === "TaggedTemplateExpression" ? lastOf(node.tag) : "";
}

/** Tests mirror the source path for path: tests/lib/numerics/sum.test.ts stands for lib/numerics/sum.ts. */
export function testsWithoutSource(paths: readonly string[]): readonly Finding[] {
  const known = new Set(paths.map((path) => path.replace(/\.tsx?$/, "")));
  return paths.flatMap((path) => {
    const mirrored = /^tests\/((?:lib|db|worker|components|app)\/.*?)(?:\.slow)?\.test\.tsx?$/.exec(path)?.[1];
    return mirrored === undefined || known.has(mirrored) ? [] : [`${path} mirrors no source ${mirrored}`];
  });
}
