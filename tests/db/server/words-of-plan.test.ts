import { expect, test } from "vitest";
import { gasDangerousTanks, markInWords } from "@/db/server/words-of-plan";
import type { TestRecord } from "@/lib/record/test-record";

const tank = (id: string, contents: string) =>
  ({ id, contents, density: 1, measure: "sounding", table: [] }) as TestRecord["tanks"][number];

test("says where a mark stands: along the ship in thirds, and on which side", () => {
  expect(markInWords({ x: 2, y: -5 }, 60)).toBe("aft, port");
  expect(markInWords({ x: 30, y: 5 }, 60)).toBe("midships, starboard");
  expect(markInWords({ x: 59, y: 0 }, 60)).toBe("forward, centreline");
});

test("takes every tank for gas-dangerous that holds anything but clean water", () => {
  const tanks = [tank("1", "fresh water"), tank("2", "gas oil"), tank("3", "oily bilge water"), tank("4", "cargo"), tank("5", "ballast")];
  expect([...gasDangerousTanks(tanks, undefined)]).toEqual(["2", "3", "4"]);
});

test("believes the plan, also where it names none", () => {
  expect([...gasDangerousTanks([tank("2", "gas oil")], [])]).toEqual([]);
});
