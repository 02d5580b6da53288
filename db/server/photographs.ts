import { createHash, randomUUID } from "node:crypto";
import { existsSync, mkdirSync, readFileSync, rmSync } from "node:fs";
import { rename, writeFile } from "node:fs/promises";
import path from "node:path";
import { eq } from "drizzle-orm";
import { answer, type Result, refuse } from "@/lib/result";
import type { EventBody } from "@/lib/sync/event";
import { PHOTOGRAPH_BYTES, type PictureType, pictureType } from "@/lib/sync/photograph";
import { eventPhotographs } from "../schema/files";
import { tellChange } from "./changes";
import type { Database } from "./connection";
import { filesFolder } from "./data-folder";
import { flushFolder } from "./flushed";
import { rolesOf } from "./role-grants";

export type PhotographRefusal =
  | { readonly type: "NoEventNamesIt" }
  | { readonly type: "TooLarge"; readonly got: number; readonly most: number }
  | { readonly type: "NoPicture" }
  | { readonly type: "OtherBytes"; readonly got: string };

export type Photograph = { readonly bytes: Uint8Array<ArrayBuffer>; readonly type: PictureType };

/** Remembers which photographs an event names, in the commit that keeps the event. */
export function notePhotographs(db: Database, body: EventBody, serverSeq: number): void {
  if (body.type !== "record" && body.type !== "correct") return;
  const { id: event, test, author } = body;
  for (const sha256 of new Set(body.photographs)) db.insert(eventPhotographs).values({ sha256, serverSeq, event, test, author }).run();
}

/**
 * Keeps the bytes of a photograph that an event names, under the hash of their content; they are on the disk when this answers. Bytes
 * that are there already are kept once: the same photograph again changes nothing.
 */
export async function keepPhotograph(
  db: Database,
  name: string,
  bytes: Uint8Array,
): Promise<Result<{ readonly isNew: boolean }, PhotographRefusal>> {
  const naming = db.select({ test: eventPhotographs.test }).from(eventPhotographs).where(eq(eventPhotographs.sha256, name)).all();
  if (naming.length === 0) return refuse({ type: "NoEventNamesIt" });
  if (bytes.length > PHOTOGRAPH_BYTES) return refuse({ type: "TooLarge", got: bytes.length, most: PHOTOGRAPH_BYTES });
  if (pictureType(bytes) === null) return refuse({ type: "NoPicture" });
  const got = hashOf(bytes);
  if (got !== name) return refuse({ type: "OtherBytes", got });
  const isNew = wholePhotograph(name) === null;
  if (isNew) await writeWhole(name, bytes);
  if (isNew) for (const test of new Set(naming.map((event) => event.test))) tellChange(test);
  return answer({ isNew });
}

export function hasArrived(name: string): boolean {
  return existsSync(fileOf(name));
}

/**
 * A photograph for a person who may see it; null where there is none for them. Their own they always may; those of others only with a
 * part in the test that is told others' readings too: a reader's phone never gets another station's photograph.
 */
export function photographFor(db: Database, name: string, person: string, at: string): Photograph | null {
  const naming = db.select().from(eventPhotographs).where(eq(eventPhotographs.sha256, name)).all();
  const isTheirs = naming.some(({ author }) => author === person);
  return isTheirs || naming.some(({ test }) => maySeeOthers(db, person, test, at)) ? wholePhotograph(name) : null;
}

function maySeeOthers(db: Database, person: string, test: string, at: string): boolean {
  return rolesOf(db, person, test, at).some((role) => role === "lead" || role === "engineer" || role === "witness");
}

/** Null where it has not come, and where the disk has spoilt it: then it may come again. */
function wholePhotograph(name: string): Photograph | null {
  if (!hasArrived(name)) return null;
  const bytes = new Uint8Array(readFileSync(fileOf(name)));
  const type = pictureType(bytes);
  return type !== null && hashOf(bytes) === name ? { bytes, type } : null;
}

// under a name of its own until it is whole: neither a crash nor a second sender leaves half a photograph under the real one
async function writeWhole(name: string, bytes: Uint8Array): Promise<void> {
  mkdirSync(filesFolder(), { recursive: true, mode: 0o700 });
  const partial = path.join(filesFolder(), `${name}.${randomUUID()}.partial`);
  try {
    await writeFile(partial, bytes, { mode: 0o600, flush: true });
    await rename(partial, fileOf(name));
  } catch (error) {
    rmSync(partial, { force: true });
    throw error;
  }
  flushFolder(filesFolder());
}

function fileOf(name: string): string {
  return path.join(filesFolder(), name);
}

function hashOf(bytes: Uint8Array): string {
  return createHash("sha256").update(bytes).digest("hex");
}
