// A page that was opened before a new build was made asks for the chunks of its own build. They are named by their content,
// so those of one build before stay beside the new ones: `aside` before `next build`, `back` after it.
import { cp, mkdir, readdir, readFile, rm, writeFile } from "node:fs/promises";
import path from "node:path";

const build = process.env.NEXT_DIST_DIR ?? ".next";
const kept = ".next-previous";
const list = "own-static-files.json";

/** Keeps what the build that stands here brought itself; what it keeps of the one before is let go. */
async function putAside() {
  const own = await readFile(path.join(build, list), "utf8").then(JSON.parse, () => null);
  if (own === null) return;
  await rm(kept, { recursive: true, force: true });
  for (const file of own) await copied(path.join(build, "static", file), path.join(kept, file));
}

/** Notes what the new build brought, and puts back what it did not. */
async function putBack() {
  const own = await filesUnder(path.join(build, "static"));
  await writeFile(path.join(build, list), JSON.stringify(own));
  const isOwn = new Set(own);
  for (const file of await filesUnder(kept)) {
    if (!isOwn.has(file)) await copied(path.join(kept, file), path.join(build, "static", file));
  }
}

async function filesUnder(folder) {
  const entries = await readdir(folder, { recursive: true, withFileTypes: true }).catch(() => []);
  return entries.filter((entry) => entry.isFile()).map((entry) => path.relative(folder, path.join(entry.parentPath, entry.name)));
}

async function copied(from, to) {
  await mkdir(path.dirname(to), { recursive: true });
  await cp(from, to);
}

const steps = { aside: putAside, back: putBack };
const step = steps[process.argv[2]];
if (!step) throw new Error("previous-build.mjs aside | back");
await step();
