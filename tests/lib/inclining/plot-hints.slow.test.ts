import { describe, expect, it } from "vitest";
import { plotHints } from "@/lib/inclining/plot-hints";
import { seededNoise } from "@/lib/numerics/seeded-noise";
import { tableUnder } from "../../architecture/markdown";
import { textFile } from "../../architecture/project";
import { type Kind, readingsAlone, simulatedPlot } from "./simulated-plots";

const plots = 1000;
const kinds: readonly Kind[] = ["none", "free-liquid", "restraint", "steady-wind", "gust", "misread"];

type Tally = { readonly kind: Kind; readonly strength: number; readonly first: number; readonly among: number; readonly silent: number };

const study = [1, 0.5].flatMap((strength) =>
  kinds.filter((kind) => strength === 1 || kind !== "none").map((kind, i) => tallyOf(kind, strength, 100 * strength + i)),
);

function tallyOf(kind: Kind, strength: number, seed: number): Tally {
  const noise = seededNoise(seed);
  const named = Array.from({ length: plots }, () => plotHints(simulatedPlot(kind, strength, noise), readingsAlone));
  return {
    kind,
    strength,
    first: named.filter(([hint]) => hint?.cause === kind).length,
    among: named.filter((hints) => hints.some(({ cause }) => cause === kind)).length,
    silent: named.filter((hints) => hints.length === 0).length,
  };
}

/** As DEVELOPERS.md prints it: percent of the plots. */
function rows(): string[][] {
  const percent = (count: number) => `${((100 * count) / plots).toFixed(1)} %`;
  return study.map(({ kind, strength, first, among, silent }) => [
    kind === "none" ? "straight" : kind,
    kind === "none" ? "–" : strength === 1 ? "plain" : "half of it",
    kind === "none" ? "–" : percent(first),
    kind === "none" ? "–" : percent(among),
    percent(kind === "none" ? plots - silent : plots - silent - among),
    percent(silent),
  ]);
}

function of(kind: Kind, strength = 1): Tally {
  const found = study.find((each) => each.kind === kind && each.strength === strength);
  if (found === undefined) throw new Error(`no study of ${kind}`);
  return found;
}

describe("hints of a thousand simulated plots each", () => {
  it("call a straight plot bent in fewer than four of a hundred", () => {
    expect(plots - of("none").silent).toBeLessThan(0.04 * plots);
  });

  it.each([
    ["free-liquid", 0.75],
    ["restraint", 0.9],
    ["steady-wind", 0.9],
    ["gust", 0.9],
    ["misread", 0.9],
  ] as const)("name a plain %s first in more than %f of its plots", (kind, least) => {
    expect(of(kind).first / plots).toBeGreaterThan(least);
  });

  it.each(kinds.slice(1))("leave a plain %s out of what they name in fewer than four of a hundred", (kind) => {
    const { among, silent } = of(kind);
    expect((plots - among - silent) / plots).toBeLessThan(0.04);
  });

  it.each(kinds.slice(1))("of half the strength name %s wrongly in fewer than one of ten", (kind) => {
    const { among, silent } = of(kind, 0.5);
    expect((plots - among - silent) / plots).toBeLessThan(0.1);
  });

  it("are as often right as DEVELOPERS.md says", () => {
    for (const row of rows()) process.stdout.write(`| ${row.join(" | ")} |\n`);
    expect(tableUnder(textFile("DEVELOPERS.md").text, "## Patterns in the plot")).toEqual(rows());
  });
});
