import { accountsByName } from "@/db/server/accounts";
import { type Database, inTransaction } from "@/db/server/connection";
import { jobSheetOf } from "@/db/server/job-sheet";
import { passwordHash } from "@/db/server/passwords";
import type { SheetWords } from "@/db/server/sheet-words";
import { takeEvents } from "@/db/server/take-events";
import { planOf, savePlan } from "@/db/server/test-plan";
import { changeState, createTest } from "@/db/server/tests";
import { createVessel, vesselsByName } from "@/db/server/vessels";
import type { TestRecord } from "@/lib/record/test-record";
import { answer, promised, type Result, refuse } from "@/lib/result";
import { type DemoAct, demoDay } from "./demo-day";
import { demoWriters, deviceId, holderOf } from "./demo-devices";
import { createDemoPeople, demoPassword, demoPeople, giveDemoRoles } from "./demo-people";
import { skerryTern, skerryTernReadings } from "./skerry-tern";

const vesselId = "5ce44715-0000-4000-8000-000000000002";
const preparedAt = "2026-05-01T08:00:00.000Z";
const openedAt = "2026-05-04T07:15:00.000Z";
/** Of the noise in the crew's readings. */
const seed = 7;

/** Puts MV Skerry Tern and the first half of her test into an empty database. Refused: a database that holds anybody or any ship. */
export async function loadDemo(db: Database): Promise<Result<string, { type: "DatabaseNotEmpty" }>> {
  if (accountsByName(db).length > 0 || vesselsByName(db).length > 0) return refuse({ type: "DatabaseNotEmpty" });
  const hash = await passwordHash(demoPassword);
  return answer(
    inTransaction(db, () => {
      createDemoPeople(db, hash, preparedAt);
      const { record } = skerryTern();
      prepareTest(db, record);
      takeDay(db, record.test.id, demoDay(record, skerryTernReadings(seed)));
      return record.test.id;
    }),
  );
}

function prepareTest(db: Database, record: TestRecord): void {
  const act = { by: demoPeople.engineer.id, at: preparedAt };
  const { vessel, hydrostatics, draftMarks, tanks, previous, test } = record;
  createVessel(db, { vessel, hydrostatics, draftMarks, tanks, previous }, act, vesselId);
  promised(createTest(db, vesselId, { ...test, timeZone: "Europe/Oslo" }, act));
  giveDemoRoles(db, test.id, preparedAt);
  promised(savePlan(db, test.id, planOf(record), words, act));
  promised(changeState(db, test.id, "open", { by: demoPeople.lead.id, at: openedAt }));
}

/** Everything comes in as it does from any phone: in batches, signed, each with the number its device gave it. */
function takeDay(db: Database, test: string, day: readonly DemoAct[]): void {
  const jobTag = jobSheetOf(db, test, demoPeople.lead.id, openedAt)?.sheet.tag ?? "";
  const writers = demoWriters(db, test, jobTag, openedAt);
  for (const { device, heardAt, act } of day) {
    const events = [writers[device].written(act)];
    const { results } = takeEvents(db, { device: deviceId(device), holds: 0, events }, { account: holderOf(device), at: heardAt });
    const aside = results.find(({ outcome }) => outcome === "quarantined" || outcome === "deferred");
    if (aside) throw new Error(`the demo's ${act.type} of ${act.capturedAt} was not taken: ${aside.message}`);
  }
}

const words: SheetWords = {
  stations: {
    A: { where: "shaft tunnel, frame 20", scale: [-300, 300] },
    B: { where: "engine room, port side of the main engine", scale: [-300, 300] },
    C: { where: "thruster room, under the hatch", scale: [-300, 300] },
    U: { where: "tween deck alleyway, legs at both sides", scale: [0, 700] },
  },
  marks: {},
  moves: {
    0: "Reference",
    1: "W1 to starboard",
    2: "W2 to starboard",
    3: "W2 back to port",
    4: "W1 back to port",
    5: "W3 to port",
    6: "W4 to port",
    7: "W3 back to starboard",
    8: "W4 back to starboard",
  },
  water: ["aft", "midships", "forward"].flatMap((place) => [1, 2.5].map((depth) => ({ place, depth }))),
  rounds: ["before", "after"],
};
