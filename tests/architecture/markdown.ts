/** The places a document links to inside the project, without their anchors. */
export function localLinks(markdown: string): readonly string[] {
  const targets = [...markdown.matchAll(/\]\(([^)\s]+)\)/g)].map((match) => match[1] ?? "");
  return targets.filter((target) => !/^([a-z]+:|#)/.test(target)).map((target) => target.replace(/#.*$/, ""));
}

/** The npm scripts a document tells its reader to run. */
export function scriptsNamed(markdown: string): readonly string[] {
  const named = [...markdown.matchAll(/\bnpm (?:--silent )?(?:run (?:--silent )?([a-z][\w:-]*)|(test|start))\b/g)];
  return [...new Set(named.map((match) => match[1] ?? match[2] ?? ""))];
}

/** The cells of the table under a heading, without its head. */
export function tableUnder(markdown: string, heading: string): readonly (readonly string[])[] {
  const lines = sectionUnder(markdown, heading).split("\n");
  const rows = lines.filter((line) => line.startsWith("|")).slice(2);
  return rows.map((row) =>
    row
      .slice(1, row.lastIndexOf("|"))
      .split(/(?<!\\)\|/)
      .map((cell) => cell.trim()),
  );
}

/** What stands under a heading, up to the next one of its rank or higher. */
export function sectionUnder(markdown: string, heading: string): string {
  const start = markdown.indexOf(`${heading}\n`);
  if (start < 0) return "";
  const rank = /^#+/.exec(heading)?.[0].length ?? 1;
  const body = markdown.slice(start + heading.length);
  const end = body.search(new RegExp(`\\n#{1,${rank}} `));
  return end < 0 ? body : body.slice(0, end);
}

/** The names between backticks, in order. */
export function codeNames(text: string): readonly string[] {
  return [...text.matchAll(/`([^`]+)`/g)].map((match) => match[1] ?? "");
}

/** What empty lines set apart: paragraphs, headings, lists, fenced code without an empty line. */
export function blocksOf(markdown: string): readonly string[] {
  return markdown.trim().split(/\n{2,}/);
}
