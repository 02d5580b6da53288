import { type FaultCount, faultRun } from "./fault-run";

/** Faults for as long as wanted: `npm run faults -- --minutes 10 --seed 1`. Ends with 1 where anything was lost, doubled or stuck. */
async function longRun(minutes: number, first: number): Promise<void> {
  const until = Date.now() + minutes * 60_000;
  const total = { events: 0, lost: 0, falselyConfirmed: 0, doubled: 0, stuck: 0, setAside: 0, unverified: 0, projectionOff: 0 };
  const faults = new Map<string, number>();
  let runs = 0;
  for (let seed = first; runs === 0 || Date.now() < until; seed++, runs++) {
    const count = await faultRun(seed, 300);
    for (const key of Object.keys(total) as (keyof typeof total)[]) total[key] += count[key];
    for (const [fault, times] of Object.entries(count.faults)) faults.set(fault, (faults.get(fault) ?? 0) + times);
    if (!isClean(count)) console.log(`seed ${seed}: ${JSON.stringify({ ...count, faults: undefined })}`);
  }
  const injected = [...faults.values()].reduce((sum, times) => sum + times, 0);
  console.log(`${runs} runs from seed ${first}: ${total.events} events tried, ${injected} faults injected`);
  console.log(
    `  lost ${total.lost}, confirmed and gone ${total.falselyConfirmed}, doubled ${total.doubled}, stuck ${total.stuck}, set aside ${total.setAside}`,
  );
  console.log(`  ledgers unverified ${total.unverified}, projections off ${total.projectionOff}`);
  for (const [fault, times] of [...faults].sort(([, a], [, b]) => b - a)) console.log(`  ${String(times).padStart(7)}  ${fault}`);
  if (Object.entries(total).some(([key, value]) => key !== "events" && value > 0)) process.exitCode = 1;
}

function isClean({ events, faults, ...wrong }: FaultCount): boolean {
  return Object.values(wrong).every((value) => value === 0);
}

function option(name: string, usual: number): number {
  const place = process.argv.indexOf(`--${name}`);
  return place < 0 ? usual : Number(process.argv[place + 1]);
}

await longRun(option("minutes", 1), option("seed", 1));
