import type { CheckLimits } from "@/lib/inclining/checks/check-limits";
import type { AgreementLimits } from "@/lib/sync/agreement";

/** One number of a limit: where it stands in the settings, and how a person thinks of it. `per`: how many of the unit make one of the record's. */
export type LimitField = {
  readonly name: string;
  readonly at: readonly ["limits", keyof CheckLimits, ...(string | number)[]] | readonly ["agreement", keyof AgreementLimits];
  readonly label: string;
  readonly unit: string;
  readonly per: number;
  readonly hint?: string;
};

type Group = { readonly title: string; readonly fields: readonly LimitField[] };

/** Every limit that a test can set, in the order of the checks. */
export const limitGroups: readonly Group[] = [
  {
    title: "The line",
    fields: [
      {
        name: "straightness",
        at: ["limits", "straightness"],
        label: "Straightness",
        unit: "%",
        per: 100,
        hint: "IMO gives no number for straightness: this is a setting. So many straight lines of a hundred are taken for bent by chance.",
      },
      { name: "heelLeast", at: ["limits", "heel", 0], label: "Heel to each side, least", unit: "°", per: 1 },
      { name: "heelMost", at: ["limits", "heel", 1], label: "Heel to each side, most", unit: "°", per: 1 },
      { name: "deflection", at: ["limits", "deflectionMm"], label: "Deflection to each side", unit: "mm", per: 1 },
      { name: "movements", at: ["limits", "movements", "full"], label: "Weight movements", unit: "", per: 1 },
      {
        name: "straightMovements",
        at: ["limits", "movements", "straight"],
        label: "Movements where the plot is straight",
        unit: "",
        per: 1,
      },
      { name: "recommended", at: ["limits", "stations", "recommended"], label: "Stations recommended", unit: "", per: 1 },
      { name: "least", at: ["limits", "stations", "least"], label: "Stations, least", unit: "", per: 1 },
      { name: "smallShip", at: ["limits", "smallShip"], label: "One station less below a length of", unit: "m", per: 1 },
      { name: "equalLengths", at: ["limits", "equalLengths"], label: "Pendulums are unequal from", unit: "%", per: 100 },
      { name: "stationSlope", at: ["limits", "stationSlope"], label: "A station’s own slope off the common one", unit: "%", per: 100 },
      { name: "zeroDrift", at: ["limits", "zeroDrift"], label: "Drift of zero, of the largest heel", unit: "%", per: 100 },
      { name: "initialList", at: ["limits", "initialList"], label: "List at zero", unit: "°", per: 1 },
    ],
  },
  {
    title: "Waterline, tanks and completeness",
    fields: [
      { name: "markError", at: ["limits", "markError"], label: "A mark off the waterline", unit: "mm", per: 1000 },
      { name: "draftChange", at: ["limits", "draftChange"], label: "Drafts before and after", unit: "mm", per: 1000 },
      { name: "trim", at: ["limits", "trim"], label: "Trim beyond the hydrostatics’, of length", unit: "%", per: 100 },
      { name: "freeboards", at: ["limits", "freeboards"], label: "Freeboards a side", unit: "", per: 1 },
      { name: "largeShip", at: ["limits", "largeShip"], label: "Water at three places from a length of", unit: "m", per: 1 },
      { name: "soundingChange", at: ["limits", "soundingChange"], label: "Soundings before and after", unit: "mm", per: 1000 },
      { name: "slackGroups", at: ["limits", "slackGroups"], label: "Slack pairs or centreline tanks", unit: "", per: 1 },
      { name: "deepLeast", at: ["limits", "deepTank", 0], label: "Slack deep tank filled, least", unit: "%", per: 100 },
      { name: "deepMost", at: ["limits", "deepTank", 1], label: "Slack deep tank filled, most", unit: "%", per: 100 },
      { name: "bottomLeast", at: ["limits", "doubleBottomTank", 0], label: "Slack double bottom filled, least", unit: "%", per: 100 },
      { name: "bottomMost", at: ["limits", "doubleBottomTank", 1], label: "Slack double bottom filled, most", unit: "%", per: 100 },
      { name: "underKeel", at: ["limits", "underKeel"], label: "Clearance under the keel", unit: "m", per: 1 },
      { name: "missing", at: ["limits", "missing"], label: "Still to come aboard, of the lightship", unit: "%", per: 100 },
      { name: "surplus", at: ["limits", "surplus"], label: "To go ashore, of the lightship", unit: "%", per: 100 },
    ],
  },
  {
    title: "Readings of one thing agree within",
    fields: [
      { name: "batten", at: ["agreement", "battenMm"], label: "Battens", unit: "mm", per: 1 },
      { name: "angle", at: ["agreement", "degrees"], label: "Inclinometers", unit: "°", per: 1 },
      { name: "draft", at: ["agreement", "draft"], label: "Drafts and freeboards", unit: "mm", per: 1000 },
      { name: "sounding", at: ["agreement", "sounding"], label: "Soundings", unit: "mm", per: 1000 },
      { name: "density", at: ["agreement", "density"], label: "Water samples", unit: "kg/m³", per: 1000 },
    ],
  },
];

export const limitFields: readonly LimitField[] = limitGroups.flatMap(({ fields }) => fields);
