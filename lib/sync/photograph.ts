import type { EventState } from "./outbox";

/** The largest photograph a server takes [bytes]: four times what one of 1600 pixels needs. */
export const PHOTOGRAPH_BYTES = 2 * 1024 * 1024;
/** The longer side of a photograph as the phone keeps it [pixels]: the marks of a batten are a few pixels apart. */
export const PHOTOGRAPH_SIDE = 1600;
export const PHOTOGRAPHS_A_READING = 4;

export type PictureType = "image/jpeg" | "image/png" | "image/webp";

/**
 * What kind of picture the bytes are, by their first bytes; null where they are none of the three that are taken.
 * Source: JPEG, ITU-T T.81 §B.1.1.3 (SOI, then a marker); PNG, ISO/IEC 15948 §5.2; WebP, RFC 9649 §2.4.
 */
export function pictureType(bytes: Uint8Array): PictureType | null {
  if (hasAt(bytes, 0, [0xff, 0xd8, 0xff])) return "image/jpeg";
  if (hasAt(bytes, 0, [0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a])) return "image/png";
  const isWebp = hasAt(bytes, 0, [0x52, 0x49, 0x46, 0x46]) && hasAt(bytes, 8, [0x57, 0x45, 0x42, 0x50]);
  return isWebp ? "image/webp" : null;
}

export type PictureSize = { readonly width: number; readonly height: number };

/** The size at which a picture is kept: its shape as it is, its longer side at most `PHOTOGRAPH_SIDE`, never enlarged. */
export function keptSize({ width, height }: PictureSize): PictureSize {
  const scale = Math.min(1, PHOTOGRAPH_SIDE / Math.max(width, height));
  return { width: Math.max(1, Math.round(width * scale)), height: Math.max(1, Math.round(height * scale)) };
}

/**
 * Where a photograph stands: beside a reading that is not saved yet, saved and owed to the server, or on the server. Its events
 * stand on their own way.
 */
export type PhotographState = "unfinished" | "saved" | "on-server";

type Keeping = {
  readonly state: PhotographState;
  /** the phone's last number when the server answered for the photograph; null before */
  readonly sentAtSeq: number | null;
  /** [ms since 1970] */
  readonly sentAt: number | null;
  /** every event of this phone that names it */
  readonly events: readonly { readonly state: EventState }[];
  /** the highest number of this phone's events that is in a backup */
  readonly confirmedSeq: number;
};

const KEPT_MS = 30 * 24 * 3_600_000;

/**
 * Whether the phone may let a photograph go: it is on the server, and so is every event that names it, in a backup; a backup has
 * been made since the photograph arrived (it holds a later event of this phone); and thirty days have passed.
 */
export function mayLetGo({ state, sentAtSeq, sentAt, events, confirmedSeq }: Keeping, now: number): boolean {
  if (state !== "on-server" || sentAt === null || sentAtSeq === null) return false;
  return events.length > 0 && events.every((event) => event.state === "confirmed") && confirmedSeq > sentAtSeq && now - sentAt >= KEPT_MS;
}

function hasAt(bytes: Uint8Array, place: number, wanted: readonly number[]): boolean {
  return wanted.every((byte, i) => bytes[place + i] === byte);
}
