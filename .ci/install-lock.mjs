import { open, readFile, rm } from "node:fs/promises";
import path from "node:path";
import { setTimeout as sleep } from "node:timers/promises";
import { root, say } from "./house.mjs";

const lockFile = path.join(root, ".install-lock");
const patience = 15 * 60_000;

/** Runs `work` while no other install runs in this folder: two at once wipe each other's packages. */
export async function withInstallLock(work) {
  await takeLock(Date.now() + patience);
  try {
    return await work();
  } finally {
    await rm(lockFile, { force: true });
  }
}

async function takeLock(deadline) {
  for (let told = false; !(await isLockTaken()); told = true) {
    const holder = await readFile(lockFile, "utf8").catch(() => "");
    if (holder !== "" && !isRunning(Number(holder))) await rm(lockFile, { force: true });
    else if (Date.now() > deadline) throw new Error(`Another install (process ${holder}) holds ${lockFile} for too long.`);
    else {
      if (!told) say(`Waiting for another install (process ${holder}) in this folder …`);
      await sleep(500);
    }
  }
}

async function isLockTaken() {
  try {
    const file = await open(lockFile, "wx");
    await file.writeFile(String(process.pid));
    await file.close();
    return true;
  } catch (error) {
    if (error.code === "EEXIST") return false;
    throw error;
  }
}

function isRunning(pid) {
  try {
    process.kill(pid, 0);
    return true;
  } catch (error) {
    return error.code === "EPERM";
  }
}
