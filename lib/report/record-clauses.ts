import type { RecordFault } from "@/lib/record/record-faults";
import type { Clauses } from "./known-refusal";

export const recordClauses: Clauses<RecordFault> = {
  NotJson: ({ reason }) => `not a JSON document: ${reason}`,
  NotAsNeeded: ({ needed, given }) => `${needed} needed, ${given} given`,
  UnknownKey: ({ key }) => `unknown key "${key}"`,
  RepeatedName: ({ name, first }) => `${name} is given twice, first in ${first}`,
  UnknownReference: ({ kind, name }) => `${kind} ${name} is not in the plan`,
  SoundingWithoutPlace: ({ given }) =>
    given === "neither" ? "a sounding needs a round or a move, neither given" : "a sounding needs a round or a move, both given",
  NotBallast: ({ tank }) => `tank ${tank} was sounded at a move but is not ballast that shifts`,
};
