import { readdirSync, readFileSync } from "node:fs";
import path from "node:path";
import { fileURLToPath } from "node:url";

export type TextFile = { readonly path: string; readonly text: string };

export const root = fileURLToPath(new URL("../..", import.meta.url));

const generated = /^(\.git|node_modules|\.next.*|\.data.*|test-results|playwright-report)$/;
const generatedFile =
  /(^|\/)(next-env\.d\.ts|.*\.tsbuildinfo|\.install-lock|\.env.*)$|^public\/service-worker\.js(\.map)?$|^tests\/pictures\//;
const textual = /(\.(ts|tsx|mjs|js|json|css|md|sql|csv|svg|yml|html)|\/run|(^|\/)\.[a-z]+)$/;
const code = /\.(ts|tsx|mjs|js)$/;

/** Every file of the project that somebody wrote, path from the root with forward slashes. */
export const projectPaths: readonly string[] = pathsUnder("").filter((file) => !generatedFile.test(file));

export const textFiles: readonly TextFile[] = projectPaths.filter((file) => textual.test(file)).map(textFile);
export const codeFiles: readonly TextFile[] = textFiles.filter((file) => code.test(file.path));

export function textFile(file: string): TextFile {
  return { path: file, text: readFileSync(path.join(root, file), "utf8") };
}

function pathsUnder(folder: string): string[] {
  const entries = readdirSync(path.join(root, folder), { withFileTypes: true });
  return entries
    .filter((entry) => !generated.test(entry.name))
    .flatMap((entry) => (entry.isDirectory() ? pathsUnder(`${folder}${entry.name}/`) : [`${folder}${entry.name}`]));
}
