import { type ESTree, type ParseResult, parseSync } from "vite";
import type { TextFile } from "./project";

export type Node = ESTree.Node;
export type NodeOf<T extends Node["type"]> = Extract<Node, { type: T }>;
type Span = { readonly start: number; readonly end: number };

/** A node in its place in the tree. */
export type Placed = { readonly node: Node; readonly parent: Node | null };

/** A parsed source: every node of its syntax tree in reading order, and its comments. */
export type Source = TextFile & {
  readonly program: ESTree.Program;
  readonly nodes: readonly Placed[];
  readonly comments: ParseResult["comments"];
};

/** What a rule found, where. An empty list is a rule that holds. */
export type Finding = string;

export function sourceOf({ path, text }: TextFile): Source {
  const { program, comments, errors } = parseSync(path, text, { sourceType: "module" });
  const [error] = errors;
  if (error) throw new Error(`${path}: ${error.message}`);
  return { path, text, program, comments, nodes: placedNodes(program) };
}

export function finding(source: TextFile, offset: number, what: string): Finding {
  return `${source.path}:${lineAt(source.text, offset)} ${what}`;
}

/** How many lines a stretch of the source covers. */
export function linesOf(source: TextFile, { start, end }: Span): number {
  return lineAt(source.text, end) - lineAt(source.text, start) + 1;
}

/** The nodes of one kind, in the whole source or inside a stretch of it. */
export function nodesOfType<T extends Node["type"]>(source: Source, type: T, within: Span = source.program): NodeOf<T>[] {
  return source.nodes.flatMap(({ node }) => (isOfType(node, type) && node.start >= within.start && node.end <= within.end ? [node] : []));
}

export function isOfType<T extends Node["type"]>(node: Node, type: T): node is NodeOf<T> {
  return node.type === type;
}

function placedNodes(program: Node): readonly Placed[] {
  const nodes: Placed[] = [];
  const gather = (node: Node, parent: Node | null): void => {
    nodes.push({ node, parent });
    for (const child of childrenOf(node)) gather(child, node);
  };
  gather(program, null);
  return nodes;
}

function childrenOf(node: Node): Node[] {
  return Object.entries(node).flatMap(([key, value]) => (key === "parent" ? [] : [value].flat().filter(isNode)));
}

function isNode(value: unknown): value is Node {
  return typeof value === "object" && value !== null && "type" in value && typeof value.type === "string" && "start" in value;
}

function lineAt(text: string, offset: number): number {
  return text.slice(0, offset).split("\n").length;
}
