import { execFile } from "node:child_process";
import { readFile, rm, writeFile } from "node:fs/promises";
import path from "node:path";
import { fileURLToPath } from "node:url";
import { promisify } from "node:util";

const root = fileURLToPath(new URL("../..", import.meta.url));
const run = promisify(execFile);
const folder = ".next-newer";
// what a build writes beside its own folder
const shared = ["public/service-worker.js", "tsconfig.json", "next-env.d.ts"].map((file) => path.join(root, file));

/** A second production build, of a later version, beside the one that the journeys run; made as `npm run build` makes it over the first. */
export class NewerBuild {
  readonly folder = folder;
  readonly version = "newer";

  private constructor(
    private readonly before: readonly string[],
    private readonly after: readonly string[],
  ) {}

  static async make(): Promise<NewerBuild> {
    const before = await texts();
    await run(process.execPath, ["worker/previous-build.mjs", "aside"], { cwd: root });
    const env = { ...process.env, NODE_ENV: "production" as const, NEXT_DIST_DIR: folder, BATTENBOOK_VERSION: "newer" };
    await run("npm", ["run", "build"], { cwd: root, env, maxBuffer: 1 << 26 });
    const made = new NewerBuild(before, await texts());
    await made.stepsBack();
    return made;
  }

  /** The static files that it brought itself. */
  async ownFiles(): Promise<readonly string[]> {
    return JSON.parse(await readFile(path.join(root, folder, "own-static-files.json"), "utf8"));
  }

  /** Puts in place what is served from outside a build's folder: the service worker. */
  async stepsForward(): Promise<void> {
    await write(this.after);
  }

  async stepsBack(): Promise<void> {
    await write(this.before);
  }

  async remove(): Promise<void> {
    await this.stepsBack();
    await rm(path.join(root, folder), { recursive: true, force: true });
  }
}

function texts(): Promise<string[]> {
  return Promise.all(shared.map((file) => readFile(file, "utf8")));
}

async function write(given: readonly string[]): Promise<void> {
  await Promise.all(shared.map((file, i) => writeFile(file, given[i] ?? "")));
}
