import { createHash } from "node:crypto";
import { deflateSync } from "node:zlib";

export type Picture = { readonly bytes: Buffer; readonly name: string };

/** A true PNG of one colour: signature, IHDR, IDAT, IEND. Source: ISO/IEC 15948 §5, §11. */
export function picture(shade: number, side = 8): Picture {
  const header = Buffer.alloc(13);
  header.writeUInt32BE(side, 0);
  header.writeUInt32BE(side, 4);
  header.set([8, 0, 0, 0, 0], 8);
  const rows = Buffer.concat(Array.from({ length: side }, () => Buffer.from([0, ...Array(side).fill(shade)])));
  const signature = Buffer.from([0x89, 0x50, 0x4e, 0x47, 0x0d, 0x0a, 0x1a, 0x0a]);
  return named(Buffer.concat([signature, chunk("IHDR", header), chunk("IDAT", deflateSync(rows)), chunk("IEND", Buffer.alloc(0))]));
}

/** Bytes under the name that their hash gives them. */
export function named(bytes: Buffer): Picture {
  return { bytes, name: createHash("sha256").update(bytes).digest("hex") };
}

function chunk(type: string, data: Buffer): Buffer {
  const body = Buffer.concat([Buffer.from(type, "latin1"), data]);
  const length = Buffer.alloc(4);
  length.writeUInt32BE(data.length);
  const check = Buffer.alloc(4);
  check.writeUInt32BE(crc32(body));
  return Buffer.concat([length, body, check]);
}

/** Source: ISO/IEC 15948 Annex D. */
function crc32(bytes: Buffer): number {
  let crc = 0xffffffff;
  for (const byte of bytes) {
    crc ^= byte;
    for (let bit = 0; bit < 8; bit++) crc = (crc >>> 1) ^ (crc & 1 ? 0xedb88320 : 0);
  }
  return (crc ^ 0xffffffff) >>> 0;
}
