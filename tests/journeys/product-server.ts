import { type ChildProcess, spawn } from "node:child_process";
import { once } from "node:events";
import { mkdtemp, rm } from "node:fs/promises";
import { tmpdir } from "node:os";
import path from "node:path";
import { setTimeout as sleep } from "node:timers/promises";
import { fileURLToPath } from "node:url";
import { freePort } from "./free-port";

const root = fileURLToPath(new URL("../..", import.meta.url));
const patience = 30_000;

/** The production build on a port and a data folder of its own, to be stopped, killed and started again at will. */
export class ProductServer {
  private constructor(
    readonly port: number,
    readonly dataFolder: string,
    readonly url: string,
  ) {}

  /** Where its backups go; none where null. */
  backupFolder: string | null = null;
  /** The folder of the build that the next start serves. */
  build = process.env.NEXT_DIST_DIR ?? ".next";
  private child: ChildProcess | null = null;
  private output = "";

  /** A server that is not started yet, on an empty data folder; people reach it at its own port, or by what stands before it. */
  static async make(url?: string): Promise<ProductServer> {
    const port = await freePort();
    const folder = await mkdtemp(path.join(tmpdir(), "battenbook-data-"));
    return new ProductServer(port, folder, url ?? `http://localhost:${port}`);
  }

  /** What the server has written on its way. */
  get log(): string {
    return this.output;
  }

  /** Starts on the same port and data as before, and waits until it answers. */
  start(): Promise<void> {
    return this.answering(this.spawned([process.execPath, ...this.nextStart]));
  }

  /** Starts with its data copied to a file system of this size [MiB], which ends with the server. */
  startOnSmallDisk(mebibytes: number): Promise<void> {
    const aboard = 'cp -a "$0/." /mnt && mount -t tmpfs -o size=$1m tmpfs "$0" && cp -a /mnt/. "$0" && shift && exec "$@"';
    const script = `mount -t tmpfs tmpfs /mnt && ${aboard}`;
    const ownDisk = ["unshare", "--map-root-user", "--mount", "sh", "-c", script, this.dataFolder, String(mebibytes)];
    return this.answering(this.spawned([...ownDisk, process.execPath, ...this.nextStart]));
  }

  /** The data folder as the server sees it. */
  get folderSeen(): string {
    return path.join("/proc", String(this.child?.pid), "root", this.dataFolder);
  }

  private get nextStart(): readonly string[] {
    return ["node_modules/next/dist/bin/next", "start", "--port", String(this.port)];
  }

  private async answering(child: ChildProcess): Promise<void> {
    this.child = child;
    const deadline = Date.now() + patience;
    while (!(await this.answers())) {
      if (child.exitCode !== null || Date.now() > deadline) throw new Error(`the server does not answer:\n${this.output}`);
      await sleep(100);
    }
  }

  /** Runs one of the project's TypeScript commands on this server's data, and gives what it prints. */
  async command(file: string, ...args: string[]): Promise<string> {
    const child = this.spawned([process.execPath, "node_modules/tsx/dist/cli.mjs", "--conditions=react-server", file, ...args]);
    let printed = "";
    child.stdout?.on("data", (chunk) => {
      printed += chunk;
    });
    const [code] = await once(child, "close");
    if (code !== 0) throw new Error(`${file} ended with ${code}:\n${this.output}`);
    return printed;
  }

  /** Asks the server to end, and waits until it has. */
  async stop(): Promise<void> {
    await this.end("SIGTERM");
  }

  /** Ends the server in the middle of whatever it is doing. */
  async kill(): Promise<void> {
    await this.end("SIGKILL");
  }

  async remove(): Promise<void> {
    await this.kill();
    await rm(this.dataFolder, { recursive: true, force: true, maxRetries: 5 });
  }

  private async end(signal: NodeJS.Signals): Promise<void> {
    const child = this.child;
    this.child = null;
    if (child?.pid === undefined || child.exitCode !== null || child.signalCode !== null) return;
    const ended = once(child, "exit");
    // a group of its own, so that no worker of the server outlives it
    process.kill(-child.pid, signal);
    await ended;
  }

  private spawned([command = "", ...args]: readonly string[]): ChildProcess {
    const own = { BATTENBOOK_DATA: this.dataFolder, NEXTAUTH_URL: this.url, NEXT_DIST_DIR: this.build };
    const backups = this.backupFolder === null ? {} : { BATTENBOOK_BACKUP_FOLDER: this.backupFolder };
    const env = { ...process.env, NODE_ENV: "production" as const, NEXT_TELEMETRY_DISABLED: "1", ...own, ...backups };
    const child = spawn(command, args, { cwd: root, env, detached: true, stdio: ["ignore", "pipe", "pipe"] });
    for (const stream of [child.stdout, child.stderr]) stream?.on("data", (chunk) => this.hear(String(chunk)));
    return child;
  }

  private hear(chunk: string): void {
    this.output += chunk;
  }

  private answers(): Promise<boolean> {
    return fetch(`http://localhost:${this.port}/manifest.webmanifest`).then(
      (response) => response.ok,
      () => false,
    );
  }
}
