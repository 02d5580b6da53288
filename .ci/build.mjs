import { createHash } from "node:crypto";
import { existsSync } from "node:fs";
import { readdir, readFile, rm, writeFile } from "node:fs/promises";
import path from "node:path";
import { run } from "./child.mjs";
import { isCommand, root, runAsCommand, say } from "./house.mjs";
import { install } from "./install.mjs";

const sources = ["app", "components", "db", "lib", "public", "worker"];
const buildFolder = path.join(root, process.env.NEXT_DIST_DIR ?? ".next");
const stampFile = path.join(buildFolder, "battenbook-build-stamp");

/** Makes the production build what the sources say; does nothing where it already is. */
export async function build() {
  const stamp = await stampOfSources();
  if (await isBuilt(stamp)) return;
  say("Building the application (about half a minute) …");
  await rm(stampFile, { force: true });
  const { code, output } = await run("npm", ["run", "build"], { quiet: true });
  if (code !== 0) throw new Error(`${output.trim()}\nThe application could not be built (npm run build ended with ${code}).`);
  await writeFile(stampFile, stamp);
}

async function isBuilt(stamp) {
  const built = await readFile(stampFile, "utf8").catch(() => null);
  return built === stamp && existsSync(path.join(buildFolder, "BUILD_ID"));
}

/** A hash over every file that has a part in the build, except what the build itself writes. */
async function stampOfSources() {
  const generated = new Set(await generatedFiles());
  const folders = await Promise.all(sources.map((folder) => filesUnder(path.join(root, folder))));
  const files = [...(await configFiles()), ...folders.flat()].filter((file) => !generated.has(file)).sort();
  const hash = createHash("sha256").update(process.version);
  for (const file of files) {
    hash.update(`\0${path.relative(root, file)}\0`);
    hash.update(await readFile(file));
  }
  return hash.digest("hex");
}

async function filesUnder(folder) {
  if (!existsSync(folder)) return [];
  const entries = await readdir(folder, { recursive: true, withFileTypes: true });
  return entries.filter((entry) => entry.isFile()).map((entry) => path.join(entry.parentPath ?? entry.path, entry.name));
}

async function configFiles() {
  const names = await readdir(root);
  const isConfig = (name) => /\.config\.[a-z]+$/.test(name) || /^(instrumentation|proxy)\.ts$/.test(name);
  return [...names.filter(isConfig), "package-lock.json", "package.json", "tsconfig.json"].map((name) => path.join(root, name));
}

/** What the build writes into public/: .gitignore names those files. */
async function generatedFiles() {
  const ignored = await readFile(path.join(root, ".gitignore"), "utf8");
  const lines = ignored.split("\n").filter((line) => line.startsWith("public/"));
  return lines.map((line) => path.join(root, line.trim()));
}

if (isCommand(import.meta.url)) {
  await runAsCommand(async () => {
    await install();
    await build();
  });
}
