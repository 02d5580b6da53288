import "fake-indexeddb/auto";
import { cleanup, fireEvent, render, screen, waitFor } from "@testing-library/react";
import { afterEach, beforeEach, describe, expect, test } from "vitest";
import { ReadingFlow } from "@/components/readings/task/reading-flow";
import type { SheetHere } from "@/components/readings/task/use-job-sheet";
import { deviceDatabase } from "@/db/device/device-database";
import { bodyOf } from "@/db/device/own-readings";
import type { Slot } from "@/lib/sync/slot";
import { atMove1, freshPhone, test1 } from "../../../db/device/phone";

const person = { id: "5b3f2c1e-0a4d-4b8e-9c55-6f0a1d2e3c42", name: "A. Reader" };
const here = { sheet: { tag: "tag", test: { id: test1 } }, person, fetchedAt: "2026-05-04T06:00:00Z" } as unknown as SheetHere;

beforeEach(freshPhone);
afterEach(cleanup);

function show(slot: Slot = atMove1) {
  return render(
    <ReadingFlow here={here} slot={slot} empty="" formOf={() => "101"} shown={() => "101 mm"} next={<a href="/next">Next</a>}>
      {({ form, type, save, correcting }) => (
        <>
          <input aria-label="Digits" value={form} onChange={(event) => type(event.target.value)} />
          <button type="button" onClick={() => save({ mode: "settled", valuesMm: [Number(form)] })}>
            {correcting ? "Save correction" : "Save"}
          </button>
        </>
      )}
    </ReadingFlow>,
  );
}

const digits = () => screen.findByLabelText("Digits");
const press = async (name: string | RegExp) => fireEvent.click(await screen.findByRole("button", { name }));
const types = async () => (await deviceDatabase().events.toArray()).sort((a, b) => a.seq - b.seq).map((event) => bodyOf(event).type);

describe("a reading", () => {
  test("is called saved once it stands on the phone's disk, and once only however often the key is pressed", async () => {
    show();
    fireEvent.change(await digits(), { target: { value: "101" } });
    const save = screen.getByRole("button", { name: "Save" });
    fireEvent.click(save);
    fireEvent.click(save);
    await screen.findByText("Saved on this phone");
    expect(await types()).toEqual(["record"]);
  });

  test("is there half typed after a reload", async () => {
    const { unmount } = show();
    fireEvent.change(await digits(), { target: { value: "10" } });
    await waitFor(async () => expect(await deviceDatabase().unfinished.count()).toBe(1));
    unmount();
    show();
    expect(await digits()).toHaveProperty("value", "10");
  });

  test("read again in the same place must first be named", async () => {
    show();
    fireEvent.change(await digits(), { target: { value: "101" } });
    await press("Save");
    await screen.findByText("Saved on this phone");
    cleanup();
    show();
    await press(/Second look/);
    fireEvent.change(await digits(), { target: { value: "102" } });
    await press("Save");
    await waitFor(async () => expect(await types()).toEqual(["record", "record"]));
  });

  test("is corrected or taken back by a further event, and never changed", async () => {
    show();
    fireEvent.change(await digits(), { target: { value: "101" } });
    await press("Save");
    await press("Correct");
    await press("Save correction");
    await screen.findByText("Correction saved on this phone");
    await press("Undo");
    await press("Mistyped");
    await digits();
    expect(await types()).toEqual(["record", "correct", "void"]);
    const bodies = (await deviceDatabase().events.toArray()).sort((a, b) => a.seq - b.seq);
    expect(bodies.map((event) => bodyOf(event).base)).toEqual([null, bodies[0]?.id, bodies[1]?.id]);
  });
});

describe("a phone whose store refuses", () => {
  test("stops with the value on the screen and offers the export file", async () => {
    show();
    fireEvent.change(await digits(), { target: { value: "101" } });
    const refused = () => {
      throw new Error("the disk is full");
    };
    deviceDatabase().events.hook("creating", refused);
    await press("Save");
    const alarm = await screen.findByText("Not saved");
    deviceDatabase().events.hook("creating").unsubscribe(refused);
    expect(alarm.closest("dialog")?.textContent).toContain("101 mm");
    await press("Save the export file");
    await press("Try again");
    await screen.findByText("Saved on this phone");
    expect(await types()).toEqual(["record"]);
  });
});
