import { figure } from "@/lib/report/rounding";
import { backUpNow } from "../backup-schedule";
import { database } from "../connection";

/** Makes one backup now, also beside a running server; exit code 1 where none was made. */
const made = await backUpNow();
if (made.ok) console.log(`${made.value.file}: whole, ${figure(made.value.bytes / 1e6, 1)} MB, events up to ${made.value.serverSeq}`);
else process.exitCode = 1;
database().$client.close();
