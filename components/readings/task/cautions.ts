export type Task = "batten" | "draft" | "sounding" | "water" | "conditions";

const weights = "Never under a moving weight. Stand clear of its path and of the crane.";
const still =
  "Stay at your place while readings are taken. If the ship heels more than expected or does not come back: stop, tell the lead.";
const tank = "No entry into a tank or void space without a permit and a tested atmosphere.";
const gas = "This phone is not certified for gas-dangerous spaces. At fuel and cargo tanks it stays outside: call the sounding out.";
const boat = "Lifejacket on and fastened in the boat, and never alone.";
const quay = "Mind the gap, the ladders and the moorings under load.";

/** What each person confirms before the readings of a task start. */
export const cautionsOf: Record<Task, readonly string[]> = {
  batten: [weights, still],
  draft: [boat, weights],
  sounding: [tank, gas, weights],
  water: [boat, quay],
  conditions: [weights, quay],
};

export const taskNames: Record<Task, string> = {
  batten: "Batten readings",
  draft: "Draft marks and freeboards",
  sounding: "Soundings",
  water: "Water density",
  conditions: "Conditions and notes",
};
