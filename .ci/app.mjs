import { spawn } from "node:child_process";
import { once } from "node:events";
import { setTimeout as sleep } from "node:timers/promises";
import { build } from "./build.mjs";
import { run } from "./child.mjs";
import { root, runAsCommand, say } from "./house.mjs";
import { install } from "./install.mjs";
import { wantedPort } from "./port.mjs";

const patience = 60_000;

/** `npm run app`: from a fresh copy to a running program, until somebody stops it. */
async function app() {
  const port = await wantedPort();
  await install();
  await build();
  const demo = await filledDemo();
  // minutes may have passed since the first look
  await wantedPort();
  await serve(port, demo);
}

/** Fills an empty database with the demo; what it tells, accounts and passwords, is for the person to read. */
async function filledDemo() {
  const { code, output } = await run("npm", ["run", "--silent", "demo"], { quiet: true });
  if (code !== 0) throw new Error(`${output.trim()}\nThe database could not be prepared.`);
  return output.trim();
}

async function serve(port, demo) {
  const url = `http://localhost:${port}`;
  const server = spawn(process.execPath, ["node_modules/next/dist/bin/next", "start", "--port", String(port)], {
    cwd: root,
    env: { ...process.env, NODE_ENV: "production", NEXT_TELEMETRY_DISABLED: "1", NEXTAUTH_URL: process.env.NEXTAUTH_URL ?? url },
    stdio: ["ignore", "ignore", "inherit"],
  });
  const ended = once(server, "exit");
  const wasStopped = stopWithUs(server);
  if (await answers(url, server)) say(`\nBattenbook runs at ${url}\n\n${demo}\n\nStop it with Ctrl+C.`);
  const [code] = await ended;
  if (!wasStopped()) throw new Error(`The server ended by itself (${code}).`);
  say("Stopped.");
}

/** Hands SIGINT and SIGTERM on to the server and lets it end its work; tells whether one came. */
function stopWithUs(server) {
  let stopped = false;
  const stop = () => {
    stopped = true;
    server.kill("SIGTERM");
  };
  for (const signal of ["SIGINT", "SIGTERM"]) process.on(signal, stop);
  stopWithNpm(stop);
  return () => stopped;
}

// npm ends on SIGTERM without telling its children: whoever was started by it looks whether it is still there
function stopWithNpm(stop) {
  if (process.env.npm_lifecycle_event === undefined) return;
  const npm = process.ppid;
  const watch = setInterval(() => process.ppid !== npm && stop(), 250);
  watch.unref();
}

async function answers(url, server) {
  const deadline = Date.now() + patience;
  while (server.exitCode === null && server.signalCode === null && Date.now() < deadline) {
    const isUp = await fetch(`${url}/manifest.webmanifest`).then(
      (response) => response.ok,
      () => false,
    );
    if (isUp) return true;
    await sleep(100);
  }
  return false;
}

await runAsCommand(app);
