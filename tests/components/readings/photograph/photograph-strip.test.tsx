import "fake-indexeddb/auto";
import { cleanup, fireEvent, render, screen, waitFor } from "@testing-library/react";
import { afterEach, beforeEach, describe, expect, test, vi } from "vitest";
import { ReadingFlow } from "@/components/readings/task/reading-flow";
import type { SheetHere } from "@/components/readings/task/use-job-sheet";
import { deviceDatabase } from "@/db/device/device-database";
import { bodyOf } from "@/db/device/own-readings";
import { PHOTOGRAPH_BYTES } from "@/lib/sync/photograph";
import type { Slot } from "@/lib/sync/slot";
import { atMove1, freshPhone, test1 } from "../../../db/device/phone";

const person = { id: "5b3f2c1e-0a4d-4b8e-9c55-6f0a1d2e3c42", name: "A. Reader" };
const here = { sheet: { tag: "tag", test: { id: test1 } }, person, fetchedAt: "2026-05-04T06:00:00Z" } as unknown as SheetHere;

/** A camera whose pictures have this size, and a canvas that makes of each as many bytes as it is told. */
function browserDraws(bytes: (quality: number) => number, size = { width: 4032, height: 3024 }) {
  const drawn: { width: number; height: number; quality: number }[] = [];
  vi.stubGlobal("createImageBitmap", async (file: File) => {
    if (file.type !== "image/jpeg") throw new DOMException("no picture", "InvalidStateError");
    return { ...size, close: () => undefined };
  });
  vi.stubGlobal(
    "OffscreenCanvas",
    class {
      constructor(
        readonly width: number,
        readonly height: number,
      ) {}
      getContext() {
        return { drawImage: () => undefined };
      }
      async convertToBlob({ quality }: { quality: number }) {
        drawn.push({ width: this.width, height: this.height, quality });
        return new Blob([new Uint8Array(bytes(quality)).fill(drawn.length)]);
      }
    },
  );
  return drawn;
}

beforeEach(freshPhone);
afterEach(() => {
  cleanup();
  vi.unstubAllGlobals();
});

function show(slot: Slot = atMove1) {
  render(
    <ReadingFlow here={here} slot={slot} empty="" formOf={() => "101"} shown={() => "101 mm"} next={null}>
      {({ save }) => (
        <button type="button" onClick={() => save({ mode: "settled", valuesMm: [101] })}>
          Save
        </button>
      )}
    </ReadingFlow>,
  );
}

async function photograph(type = "image/jpeg") {
  fireEvent.change(await screen.findByLabelText("Photograph"), {
    target: { files: [new File(["as the camera wrote it"], "IMG_1.jpg", { type })] },
  });
}

async function savedReading() {
  fireEvent.click(await screen.findByRole("button", { name: "Save" }));
  await screen.findByText("Saved on this phone");
  const [event] = await deviceDatabase().events.toArray();
  const body = event ? bodyOf(event) : null;
  return body?.type === "record" ? body : expect.fail("no reading was saved");
}

describe("a photograph of a reading", () => {
  test("is made small, kept, shown, and named by the reading", async () => {
    const drawn = browserDraws(() => 300_000);
    show();
    await photograph();
    await screen.findByRole("button", { name: "Take out photograph 1" });
    expect(drawn).toEqual([{ width: 1600, height: 1200, quality: 0.8 }]);
    const { photographs } = await savedReading();
    expect(await deviceDatabase().photographs.toArray()).toMatchObject([{ sha256: photographs?.[0], state: "saved" }]);
  });

  test("goes with the reading although it was still being made small when Save was pressed", async () => {
    browserDraws(() => 300_000);
    show();
    await photograph();
    expect((await savedReading()).photographs).toHaveLength(1);
  });

  test("is drawn more coarsely where it would be too large", async () => {
    const drawn = browserDraws((quality) => (quality > 0.7 ? PHOTOGRAPH_BYTES + 1 : 1000));
    show();
    await photograph();
    await screen.findByRole("button", { name: "Take out photograph 1" });
    expect(drawn.map(({ quality }) => quality)).toEqual([0.8, 0.6]);
  });

  test("can be taken out again, and the reading then names none", async () => {
    browserDraws(() => 1000);
    show();
    await photograph();
    fireEvent.click(await screen.findByRole("button", { name: "Take out photograph 1" }));
    await waitFor(() => expect(screen.queryByRole("button", { name: "Take out photograph 1" })).toBeNull());
    expect(await savedReading()).not.toHaveProperty("photographs");
  });

  test("is not asked for where there is nothing to see", async () => {
    show({ kind: "note" });
    await screen.findByRole("button", { name: "Save" });
    expect(screen.queryByLabelText("Photograph")).toBeNull();
  });
});

describe("a photograph that cannot be kept", () => {
  test("because it is no picture is told in one sentence, and the reading is saved without it", async () => {
    browserDraws(() => 1000);
    show();
    await photograph("text/plain");
    await screen.findByText("This file is no picture that this browser can read. Save the reading without it.");
    expect(await savedReading()).not.toHaveProperty("photographs");
  });

  test("because it is too large, however coarse, is told", async () => {
    browserDraws(() => PHOTOGRAPH_BYTES + 1);
    show();
    await photograph();
    await screen.findByText("This picture is too large. Save the reading without it.");
    expect(await savedReading()).not.toHaveProperty("photographs");
  });

  test("because the phone is full is told, and the reading is saved without it", async () => {
    browserDraws(() => 1000);
    const full = () => {
      throw new DOMException("no room", "QuotaExceededError");
    };
    deviceDatabase().photographs.hook("creating", full);
    show();
    await photograph();
    await screen.findByText(/no room for a photograph/, undefined, { timeout: 5000 });
    deviceDatabase().photographs.hook("creating").unsubscribe(full);
    expect(await savedReading()).not.toHaveProperty("photographs");
  });

  test("because the phone is nearly full leaves the room to readings", async () => {
    browserDraws(() => 1000);
    Object.assign(navigator, { storage: { estimate: async () => ({ quota: 100_000_000, usage: 90_000_000 }) } });
    show();
    await photograph();
    await screen.findByText(/no room for a photograph/);
    expect(await deviceDatabase().photographs.count()).toBe(0);
  });
});
