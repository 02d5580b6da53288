import { database } from "../connection";
import { projectionOf, rebuildProjection } from "../rebuild-projection";
import { everyTest } from "../tests";

/** Works out anew, from the events alone, what stands in every test; exit code 1 where something else stood there before. */
const db = database();
for (const { id, title } of everyTest(db)) {
  const before = new Set(projectionOf(db, id));
  rebuildProjection(db, id);
  const after = new Set(projectionOf(db, id));
  const mended = [...after].filter((row) => !before.has(row)).length + [...before].filter((row) => !after.has(row)).length;
  console.log(
    `${title}: ${after.size} rows from the events${mended === 0 ? ", as they stood" : `; ${mended} stood otherwise and are mended`}`,
  );
  if (mended > 0) process.exitCode = 1;
}
db.$client.close();
