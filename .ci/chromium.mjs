import { access } from "node:fs/promises";
import { isOnPath, run } from "./child.mjs";
import { isCommand, runAsCommand, say } from "./house.mjs";

export const chromiumPath = "/usr/bin/chromium";

/** Makes sure that the browser for the journeys is there; refuses with the reason where it can't be. */
export async function chromium() {
  if (await isThere()) return;
  if (process.getuid?.() !== 0) throw new Error(missing("it can be installed only by root"));
  if (!(await isOnPath("apt-get"))) throw new Error(missing("this system has no apt-get"));
  await installChromium();
  if (!(await isThere())) throw new Error(missing("apt-get installed none there"));
}

async function installChromium() {
  say("Installing the browser for the journeys (apt-get install chromium) …");
  const env = { DEBIAN_FRONTEND: "noninteractive" };
  for (const args of [["update"], ["install", "-y", "--no-install-recommends", "chromium"]]) {
    const { code, output } = await run("apt-get", args, { quiet: true, env });
    if (code !== 0) throw new Error(missing(`apt-get ${args[0]} ended with ${code}: ${output.trim().split("\n").at(-1)}`));
  }
}

function isThere() {
  return access(chromiumPath).then(
    () => true,
    () => false,
  );
}

function missing(why) {
  return `No browser at ${chromiumPath}, and ${why}. Install Debian's package "chromium", then run the tests again.`;
}

if (isCommand(import.meta.url)) await runAsCommand(chromium);
