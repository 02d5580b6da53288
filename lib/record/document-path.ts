/** A place in a record in the document's own notation: `readings.battens[3].valuesMm`. */
export function documentPath(segments: readonly PropertyKey[]): string {
  return segments.reduce<string>((path, segment) => path + step(segment, path === ""), "");
}

/** What stands at a place in a document; undefined where there is nothing. */
export function valueAtPath(document: unknown, segments: readonly PropertyKey[]): unknown {
  return segments.reduce((value, segment) => {
    const isHolder = typeof value === "object" && value !== null;
    return isHolder ? Reflect.get(value, segment) : undefined;
  }, document);
}

function step(segment: PropertyKey, isFirst: boolean): string {
  if (typeof segment === "number") return `[${segment}]`;
  const key = String(segment);
  if (!/^[\p{L}\p{N}_-]+$/u.test(key)) return `[${JSON.stringify(key)}]`;
  return isFirst ? key : `.${key}`;
}
