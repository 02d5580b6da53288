import { expect, type Page } from "@playwright/test";
import { figure } from "@/lib/report/rounding";
import type { ReadingValue } from "@/lib/sync/event";
import type { Slot } from "@/lib/sync/slot";

type ValueWith<K extends string> = Extract<ReadingValue, Record<K, unknown>>;

/** What a reader's thumb does on the pages for readings: one method for each kind of reading. */
export class ReaderHand {
  constructor(
    readonly page: Page,
    private readonly server: string,
    private readonly test: string,
  ) {}

  /** Opens the page of one reading due; confirms the cautions where they are asked. */
  async open(slot: Slot): Promise<void> {
    const { kind, ...rest } = slot;
    const query = new URLSearchParams(Object.entries({ test: this.test, kind, ...rest }).map(([name, value]) => [name, String(value)]));
    await this.page.goto(`${this.server}/readings/${pages[kind]}?${query}`);
    await this.confirmCautions();
    const another = this.page.getByRole("button", { name: "Another note" });
    if (await another.isVisible()) await another.click();
  }

  async read(slot: Slot, value: ReadingValue): Promise<void> {
    await this.open(slot);
    await this.enter(value);
    await this.save();
  }

  /** Puts a value in, without saving it. */
  async enter(value: ReadingValue): Promise<void> {
    if ("portMm" in value) await this.enterLegs(value);
    else if ("valuesMm" in value) await this.enterBatten(value);
    else if ("density" in value) await this.enterWater(value);
    else if ("value" in value) await this.typeNumber(value.value);
    else if ("text" in value) await this.page.getByLabel("Note").fill(value.text);
    else throw new Error(`no reader enters ${JSON.stringify(value)} on a pad`);
  }

  /** Saves, after a second look where the phone asks for one, and waits for the large word. */
  async save(): Promise<void> {
    await this.page.getByRole("button", { name: "Save", exact: true }).click();
    const again = this.page.getByRole("button", { name: "I looked again: save" });
    const saved = this.page.getByText("Saved on this phone", { exact: true });
    await expect(again.or(saved)).toBeVisible();
    if (await again.isVisible()) await again.click();
    await expect(saved).toBeVisible();
  }

  /** Presses the keys of a number on the pad. */
  async typeNumber(value: number): Promise<void> {
    for (const character of figure(Math.abs(value), 4).replace(/\.?0+$/, "") || "0") await this.press(character);
    if (value < 0) await this.page.getByRole("button", { name: "Change sign" }).click();
  }

  private async press(character: string): Promise<void> {
    const name = character === "." ? "Decimal point" : character;
    await this.page.getByRole("button", { name, exact: true }).click();
  }

  private async enterBatten({ mode, valuesMm }: ValueWith<"valuesMm">): Promise<void> {
    if (mode === "turning-points") await this.page.getByRole("button", { name: "Turning points" }).click();
    await this.enterMarks(valuesMm);
  }

  private async enterLegs({ portMm, starboardMm }: ValueWith<"portMm">): Promise<void> {
    await this.page.getByRole("button", { name: /leg.*typing here/ }).click();
    await this.enterMarks(portMm);
    await this.page.getByRole("button", { name: /leg.*mm/ }).click();
    await this.enterMarks(starboardMm);
  }

  private async enterMarks(values: readonly number[]): Promise<void> {
    for (const [i, value] of values.entries()) {
      if (i > 0) await this.page.getByRole("button", { name: /^Next (turn|mark)$/ }).click();
      await this.typeNumber(value);
    }
  }

  private async enterWater({ density, hydrometer }: ValueWith<"density">): Promise<void> {
    if (hydrometer) await this.page.getByRole("button", { name: hydrometer, exact: true }).click();
    await this.page.getByRole("button", { name: /^Density/ }).click();
    await this.typeNumber(density);
  }

  private async confirmCautions(): Promise<void> {
    const start = this.page.getByRole("button", { name: "Confirm each caution" });
    const save = this.page.getByRole("button", { name: "Save", exact: true });
    await expect(start.or(save).or(this.page.getByRole("button", { name: "Another note" }))).toBeVisible();
    if (!(await start.isVisible())) return;
    for (const box of await this.page.getByRole("checkbox").all()) await box.check();
    await this.page.getByRole("button", { name: "Start reading" }).click();
  }
}

const pages: Record<Slot["kind"], string> = {
  batten: "batten",
  draft: "draft",
  freeboard: "draft",
  sounding: "sounding",
  ballast: "sounding",
  water: "water",
  condition: "conditions",
  note: "conditions",
  position: "held",
  length: "held",
};
