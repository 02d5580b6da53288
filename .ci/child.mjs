import { spawn } from "node:child_process";
import { constants } from "node:os";
import { root } from "./house.mjs";

/**
 * Runs a program to its end: `{ code, output }`. With `quiet` the output is kept and not shown.
 * No standard input: nothing here may wait for somebody to type.
 */
export function run(program, args, { quiet = false, env = {}, cwd = root } = {}) {
  return new Promise((resolve) => {
    const child = spawn(program, args, {
      cwd,
      env: { ...process.env, NEXT_TELEMETRY_DISABLED: "1", ...env },
      stdio: ["ignore", "pipe", "pipe"],
    });
    const kept = [];
    const keep = (stream) => (chunk) => {
      kept.push(chunk);
      if (!quiet) stream.write(chunk);
    };
    child.stdout.on("data", keep(process.stdout));
    child.stderr.on("data", keep(process.stderr));
    child.on("error", (error) => resolve({ code: 127, output: error.message }));
    child.on("close", (code, signal) => resolve({ code: code ?? 128 + constants.signals[signal], output: Buffer.concat(kept).toString() }));
  });
}

/** Runs a package's program with this very Node, so that no shell and no PATH stands between. */
export function runNode(script, args, options) {
  return run(process.execPath, [script, ...args], options);
}

export async function isOnPath(program) {
  const { code } = await run("/bin/sh", ["-c", `command -v ${program}`], { quiet: true });
  return code === 0;
}
