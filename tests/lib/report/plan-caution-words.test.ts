import { expect, test } from "vitest";
import { planCautionSentence } from "@/lib/report/plan-caution-words";

const tan = (degrees: number) => Math.tan((degrees * Math.PI) / 180);

test.each([
  [{ type: "GmSmall", stop: true, gmFluid: -0.1, least: 0.15 }, /^GM −0\.10 m is expected, less than 0\.15 m: do not incline her so\./],
  [{ type: "HeelTooLarge", stop: true, move: 4, tanHeel: tan(-4.4), mostDegrees: 4 }, /^Move 4 would heel her 4\.40°, more than 4°/],
  [{ type: "DeckEdgeInWater", stop: true, move: 2, leastFreeboard: -0.12 }, /^At move 2 the deck edge would be 0\.12 m under water\.$/],
  [
    { type: "KnuckleInWater", stop: false, crossings: [{ kind: "knuckle", x: 12, side: "port", tanHeel: -0.02 }] },
    /crosses the water between the largest heels \(port, 12\.0 m forward of AP\)/,
  ],
  [{ type: "HeelTooSmall", stop: false, side: "port", tanHeel: tan(-0.5), leastDegrees: 1 }, /^To port she would heel 0\.50° at most/],
  [{ type: "DeflectionTooSmall", stop: false, station: "B", deflectionMm: 120, leastMm: 150 }, /^Station B would show 120 mm/],
] as const)("%j", (caution, sentence) => {
  expect(planCautionSentence(caution)).toMatch(sentence);
});
