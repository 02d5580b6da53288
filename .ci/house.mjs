import { fileURLToPath } from "node:url";

/** The project's root folder. */
export const root = fileURLToPath(new URL("..", import.meta.url));

/** What a person should read, on the channel where it disturbs no output. */
export function say(sentence) {
  process.stderr.write(`${sentence}\n`);
}

/** Whether this file was started as a command, and not only imported. */
export function isCommand(moduleUrl) {
  return process.argv[1] === fileURLToPath(moduleUrl);
}

/** Runs what a command is for; a failure becomes one sentence and exit 1. */
export async function runAsCommand(work) {
  try {
    await work();
  } catch (error) {
    say(error instanceof Error ? error.message : String(error));
    process.exitCode = 1;
  }
}
