import { createHash } from "node:crypto";
import { readFile, rm, writeFile } from "node:fs/promises";
import path from "node:path";
import { isOnPath, run } from "./child.mjs";
import { isCommand, root, runAsCommand, say } from "./house.mjs";
import { withInstallLock } from "./install-lock.mjs";

const stampFile = path.join(root, "node_modules", ".battenbook-stamp");

/** Makes node_modules what package-lock.json says, for this Node; does nothing where it already is. */
export async function install() {
  refuseOldNode();
  if (await isInstalled()) return;
  await withInstallLock(async () => {
    if (await isInstalled()) return;
    await installFromLock();
    await writeFile(stampFile, await stampOfLock());
  });
}

export async function isInstalled() {
  const stamp = await readFile(stampFile, "utf8").catch(() => null);
  return stamp === (await stampOfLock());
}

/** The oldest Node that every package accepts, as package.json states it. */
function refuseOldNode() {
  const [major, minor] = process.versions.node.split(".").map(Number);
  if (major > 20 || (major === 20 && minor >= 19)) return;
  throw new Error(`Battenbook needs Node 20.19 or newer; this is Node ${process.versions.node}. Install a newer Node and try again.`);
}

async function installFromLock() {
  say("Installing packages (the first time a database driver is compiled: two to three minutes) …");
  await rm(stampFile, { force: true });
  const { code, output } = await run(npm(), ["ci", "--no-audit", "--no-fund", "--loglevel=error"], {
    quiet: true,
    env: await compilerCache(),
  });
  if (code !== 0) throw new Error(`${output.trim()}\nThe packages could not be installed (npm ci ended with ${code}).`);
}

// better-sqlite3 compiles for 100 s from source, and for 3 s from a compiler cache
async function compilerCache() {
  return (await isOnPath("ccache")) ? { CC: "ccache gcc", CXX: "ccache g++" } : {};
}

function npm() {
  return process.platform === "win32" ? "npm.cmd" : "npm";
}

async function stampOfLock() {
  const lock = await readFile(path.join(root, "package-lock.json"));
  return createHash("sha256").update(lock).update(process.version).update(process.arch).digest("hex");
}

if (isCommand(import.meta.url)) await runAsCommand(install);
