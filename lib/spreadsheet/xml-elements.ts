import { SaxesParser } from "saxes";

export type XmlVisitor = {
  readonly opened: (name: string, attributes: Readonly<Record<string, string>>) => void;
  readonly text?: (text: string) => void;
  readonly closed?: (name: string) => void;
};

/** Walks an XML document from its beginning to its end, names without their prefix. Throws where it is not well-formed. */
export function walkXml(bytes: Uint8Array, visitor: XmlVisitor): void {
  const parser = new SaxesParser();
  parser.on("opentag", ({ name, attributes }) => visitor.opened(localName(name), attributes));
  parser.on("closetag", ({ name }) => visitor.closed?.(localName(name)));
  parser.on("text", (text) => visitor.text?.(text));
  parser.on("cdata", (text) => visitor.text?.(text));
  parser.on("error", (error) => {
    throw error;
  });
  parser.write(new TextDecoder().decode(bytes)).close();
}

function localName(name: string): string {
  return name.slice(name.indexOf(":") + 1);
}
