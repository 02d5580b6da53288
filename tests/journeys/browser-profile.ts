import { readdirSync, readFileSync } from "node:fs";
import { mkdtemp, rm } from "node:fs/promises";
import { tmpdir } from "node:os";
import path from "node:path";
import { setTimeout as sleep } from "node:timers/promises";
import { type BrowserContext, type BrowserContextOptions, chromium } from "@playwright/test";
import { browserLaunch } from "./browser-launch";

/** A phone or a laptop: one browser profile on disk that outlives its browser, however that ends. */
export class BrowserProfile {
  private constructor(
    private readonly folder: string,
    private readonly options: BrowserContextOptions,
  ) {}

  private opened: BrowserContext | null = null;

  static async make(options: BrowserContextOptions = {}): Promise<BrowserProfile> {
    return new BrowserProfile(await mkdtemp(path.join(tmpdir(), "battenbook-profile-")), options);
  }

  /** Starts the browser on this profile. */
  async open(): Promise<BrowserContext> {
    this.opened = await chromium.launchPersistentContext(this.folder, { ...browserLaunch, ...this.options });
    return this.opened;
  }

  /** Ends the browser as a person does. */
  async close(): Promise<void> {
    await this.opened?.close();
    this.opened = null;
  }

  /** Ends every process of this browser at once, as an empty battery does: nothing is flushed, nothing is told. */
  async kill(): Promise<void> {
    for (const pid of this.processes()) killNow(pid);
    while (this.processes().length > 0) await sleep(50);
    await this.opened?.close().catch(() => undefined);
    this.opened = null;
  }

  async remove(): Promise<void> {
    await this.close();
    await rm(this.folder, { recursive: true, force: true, maxRetries: 5 });
  }

  // the profile's folder is this profile's alone, and every process of its browser names it or descends from one that does
  private processes(): readonly number[] {
    const running = readdirSync("/proc").filter((name) => /^\d+$/.test(name));
    return running.map(Number).filter((pid) => commandOf(pid).includes(`--user-data-dir=${this.folder}`));
  }
}

function killNow(pid: number): void {
  try {
    process.kill(pid, "SIGKILL");
  } catch {
    // it has ended between the list and the signal
  }
}

function commandOf(pid: number): string {
  try {
    return readFileSync(`/proc/${pid}/cmdline`, "utf8");
  } catch {
    return "";
  }
}
