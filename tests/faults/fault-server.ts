import { mkdirSync, mkdtempSync, rmSync } from "node:fs";
import { tmpdir } from "node:os";
import path from "node:path";
import { POST } from "@/app/api/v1/sync/route";
import { backUp } from "@/db/server/backup";
import { database } from "@/db/server/connection";
import { restore } from "@/db/server/restore";
import { promised } from "@/lib/result";

/** The real route handler over the real database in a folder of its own, to be torn, stopped, and restored at will. */
export class FaultServer {
  private readonly folder = mkdtempSync(path.join(tmpdir(), "battenbook-faults-"));
  private readonly copies = path.join(this.folder, "copies");
  lastCopy = "";

  constructor() {
    this.stop();
    process.env.BATTENBOOK_DATA = path.join(this.folder, "data");
    mkdirSync(this.copies);
  }

  get db() {
    return database();
  }

  /** A request as it arrives, whatever has become of it on its way. */
  async receives(text: string, cookie: string): Promise<Response> {
    const request = new Request("http://localhost/api/v1/sync", { method: "POST", body: text, headers: { cookie } });
    // what a handler throws, the framework answers with 500
    return POST(request).catch(() => new Response("", { status: 500 }));
  }

  /** The disk fails in the middle of a batch: the commit never comes. */
  async receivesTorn(text: string, cookie: string, after: number): Promise<Response> {
    const placed = Number(this.db.$client.prepare("select count(*) from events").pluck().get()) + after;
    this.db.$client.exec(
      `create temp trigger torn before insert on main.ledger_entries when (select count(*) from events) > ${placed} begin select raise(abort, 'disk failed'); end`,
    );
    const answer = await this.receives(text, cookie);
    this.db.$client.exec("drop trigger temp.torn");
    return answer;
  }

  /** Ends without a word; the next request opens the database anew. */
  stop(): void {
    const shared = globalThis as { battenbookDatabase?: { $client: { close: () => void } } };
    shared.battenbookDatabase?.$client.close();
    shared.battenbookDatabase = undefined;
  }

  /** Copies the database as it stands, for `restore`. */
  async backUp(): Promise<void> {
    this.lastCopy = promised(await backUp(this.db, this.copies, new Date().toISOString())).file;
  }

  /** Puts the last backup in the place of the database: everything since is gone from the server, and it says so. */
  async restore(copy = this.lastCopy): Promise<void> {
    this.stop();
    promised(await restore(path.join(this.copies, copy), { at: new Date().toISOString(), force: false }));
  }

  remove(): void {
    this.stop();
    rmSync(this.folder, { recursive: true, force: true });
  }
}
