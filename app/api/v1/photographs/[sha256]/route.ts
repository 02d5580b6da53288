import { personOrRefusal, refused } from "@/app/access";
import { database } from "@/db/server/connection";
import { keepPhotograph, type Photograph, type PhotographRefusal, photographFor } from "@/db/server/photographs";
import { PHOTOGRAPH_BYTES } from "@/lib/sync/photograph";
import { photographNameSchema } from "@/lib/sync/photograph-names";

type Context = { params: Promise<{ sha256: string }> };

/** Takes the bytes of a photograph that an event names; the same again is answered as if it were new, with 200. */
export async function PUT(request: Request, { params }: Context): Promise<Response> {
  const person = await personOrRefusal(request);
  if (person instanceof Response) return person;
  const name = photographNameSchema.safeParse((await params).sha256);
  if (!name.success) return refused(400, "A photograph is named by the SHA-256 of its bytes.");
  const bytes = await bytesOf(request);
  if (bytes === null) return refusal({ type: "TooLarge", got: PHOTOGRAPH_BYTES + 1, most: PHOTOGRAPH_BYTES });
  try {
    const kept = await keepPhotograph(database(), name.data, bytes);
    if (!kept.ok) return refusal(kept.refusal);
    return Response.json({ sha256: name.data }, { status: kept.value.isNew ? 201 : 200, headers: { "cache-control": "no-store" } });
  } catch (error) {
    return notStored(error);
  }
}

export async function GET(request: Request, { params }: Context): Promise<Response> {
  const found = await photographOrRefusal(request, (await params).sha256);
  return found instanceof Response ? found : new Response(found.bytes, { headers: headersOf(found) });
}

/** Whether it is here; the tag is its name, which no portal on the way could know. */
export async function HEAD(request: Request, { params }: Context): Promise<Response> {
  const found = await photographOrRefusal(request, (await params).sha256);
  if (found instanceof Response) return new Response(null, found);
  return new Response(null, { headers: { ...headersOf(found), "content-length": String(found.bytes.length) } });
}

type Found = Photograph & { readonly name: string };

// whoever may not see it does not learn whether it is here
async function photographOrRefusal(request: Request, given: string): Promise<Found | Response> {
  const person = await personOrRefusal(request);
  if (person instanceof Response) return person;
  const name = photographNameSchema.safeParse(given);
  const photograph = name.success ? photographFor(database(), name.data, person.id, new Date().toISOString()) : null;
  return photograph && name.success ? { ...photograph, name: name.data } : refused(404, "There is no such photograph here.");
}

function headersOf({ name, type }: Found): Record<string, string> {
  return {
    "content-type": type,
    "content-disposition": `inline; filename="${name.slice(0, 12)}.${type.slice("image/".length)}"`,
    "content-security-policy": "sandbox; default-src 'none'",
    "cross-origin-resource-policy": "same-origin",
    "x-content-type-options": "nosniff",
    "cache-control": "private, max-age=31536000, immutable",
    vary: "cookie",
    etag: `"${name}"`,
  };
}

/** Null where there are more than a photograph may have: what is too large is not read to its end. */
async function bytesOf(request: Request): Promise<Uint8Array | null> {
  const pieces: Uint8Array[] = [];
  let size = 0;
  for await (const piece of (request.body ?? []) as AsyncIterable<Uint8Array>) {
    size += piece.length;
    if (size > PHOTOGRAPH_BYTES) return null;
    pieces.push(piece);
  }
  return Buffer.concat(pieces);
}

function refusal(why: PhotographRefusal): Response {
  switch (why.type) {
    case "NoEventNamesIt":
      return refused(409, "No reading that is here names this photograph; send the reading first.");
    case "TooLarge":
      return refused(413, `A photograph may have ${why.most} bytes at most.`);
    case "NoPicture":
      return refused(415, "This is no JPEG, PNG or WebP picture.");
    case "OtherBytes":
      return refused(422, "The bytes are not those that the name says; they broke on their way.");
  }
}

function notStored(error: unknown): Response {
  const code = error instanceof Error && "code" in error ? String(error.code) : "";
  if (["ENOSPC", "EDQUOT", "SQLITE_FULL"].includes(code)) return refused(507, "The server's disk is full: the phone keeps the photograph.");
  throw error;
}
