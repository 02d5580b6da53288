import type { Cause } from "@/lib/lightship/uncertain-inputs";

type Words = { readonly name: string; readonly advice: string };

const words: Readonly<Record<Cause, Words>> = {
  line: {
    name: "Scatter of the line",
    advice: "Repeat the moves that stand off the line; wait until the bobs rest, moorings slack, no gusts.",
  },
  weights: { name: "Masses of the weights", advice: "Weigh the weights again on a calibrated scale, shortly before the test." },
  "weight-places": { name: "Places of the weights", advice: "Mark the places on deck and measure athwartships to the weights' centres." },
  lengths: {
    name: "Lengths of the pendulums",
    advice: "Measure each length from the pivot to the batten's face, and each span between the legs.",
  },
  drafts: {
    name: "Draft and freeboard readings",
    advice: "Read the marks from the boat in a glass tube that stills the water, several estimates each.",
  },
  "mark-zeros": { name: "Heights of the marks", advice: "Check the marks against the keel in dry dock or by freeboards." },
  density: { name: "Water density", advice: "Take more samples at depth with a certified hydrometer." },
  items: { name: "Items off, on and moved", advice: "Weigh what is to go ashore or come aboard, or finish it before the test." },
  persons: { name: "Persons aboard", advice: "Let fewer people stay aboard, at known places." },
  soundings: { name: "Soundings", advice: "Sound each tank twice; press up or empty the slack ones." },
  "tank-tables": { name: "Tank tables", advice: "Empty the tanks whose tables are not trusted." },
  "liquid-density": { name: "Density of the liquids", advice: "Take a sample from each tank that is not empty." },
  hydrostatics: { name: "Hydrostatics of the hull", advice: "Check the lines and offsets against the ship as built." },
};

/** What is uncertain, as a line of the budget names it. */
export function causeName(cause: Cause): string {
  return words[cause].name;
}

/** What to measure better next time. */
export function causeAdvice(cause: Cause): string {
  return words[cause].advice;
}
