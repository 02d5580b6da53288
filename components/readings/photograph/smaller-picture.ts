import { answer, type Result, refuse } from "@/lib/result";
import { keptSize, PHOTOGRAPH_BYTES } from "@/lib/sync/photograph";

export type PictureRefusal = { readonly type: "NoPicture" } | { readonly type: "TooLarge" };

export type SmallerPicture = { readonly sha256: string; readonly type: "image/jpeg"; readonly bytes: Uint8Array<ArrayBuffer> };

/** A camera's picture has ten; what has more than this would only fill the phone's memory [bytes]. */
const LARGEST_FILE = 64 * 1024 * 1024;
/** tried in turn until the picture fits; at the first a figure on a batten is as sharp as the eye sees it */
const qualities = [0.8, 0.6, 0.4] as const;

/**
 * A picture as it is kept: upright, at most 1600 pixels long, JPEG, and named by its bytes. It is drawn anew, so nothing but the picture
 * is left of the file: no place, no maker, no time (EXIF).
 */
export async function smallerPicture(file: Blob): Promise<Result<SmallerPicture, PictureRefusal>> {
  if (file.size > LARGEST_FILE) return refuse({ type: "TooLarge" });
  const bitmap = await createImageBitmap(file, { imageOrientation: "from-image" }).catch(() => null);
  if (bitmap === null) return refuse({ type: "NoPicture" });
  try {
    for (const quality of qualities) {
      const drawn = await drawnAnew(bitmap, quality);
      if (drawn.size <= PHOTOGRAPH_BYTES) return answer(await named(drawn));
    }
    return refuse({ type: "TooLarge" });
  } finally {
    bitmap.close();
  }
}

async function drawnAnew(bitmap: ImageBitmap, quality: number): Promise<Blob> {
  const { width, height } = keptSize(bitmap);
  if (typeof OffscreenCanvas === "function") {
    const canvas = new OffscreenCanvas(width, height);
    canvas.getContext("2d")?.drawImage(bitmap, 0, 0, width, height);
    return canvas.convertToBlob({ type: "image/jpeg", quality });
  }
  const canvas = Object.assign(document.createElement("canvas"), { width, height });
  canvas.getContext("2d")?.drawImage(bitmap, 0, 0, width, height);
  return new Promise((done, fail) => {
    canvas.toBlob((blob) => (blob ? done(blob) : fail(new Error("the picture could not be drawn"))), "image/jpeg", quality);
  });
}

async function named(blob: Blob): Promise<SmallerPicture> {
  const bytes = new Uint8Array(await blob.arrayBuffer());
  const hash = new Uint8Array(await crypto.subtle.digest("SHA-256", bytes));
  return { sha256: Array.from(hash, (byte) => byte.toString(16).padStart(2, "0")).join(""), type: "image/jpeg", bytes };
}
