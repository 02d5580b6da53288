import { expect, test } from "vitest";
import { newPersonSchema } from "@/lib/people/new-person";

const ellen = { name: " Ellen ", email: "ellen@yard.example", isAdministrator: false, isEngineer: true };

test("a person has a name and an address", () => {
  expect(newPersonSchema.parse(ellen)).toEqual({ ...ellen, name: "Ellen" });
});

test.each([
  [{ ...ellen, name: "  " }, "Write the name."],
  [{ ...ellen, email: "ellen" }, "Write the whole address"],
  [{ ...ellen, rank: 1 }, "rank"],
])("%j is refused with a sentence", (given, why) => {
  expect(newPersonSchema.safeParse(given).error?.issues[0]?.message).toContain(why);
});
