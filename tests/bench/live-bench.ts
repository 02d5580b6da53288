import { performance } from "node:perf_hooks";
import { GET } from "@/app/api/v1/tests/[id]/live/route";
import { BenchServer, percentile, readingsOf } from "./bench-server";

/** From the answer that a phone hears to the snapshot on central control's line that holds its event. */
export async function answerToControl(count = 200): Promise<void> {
  const server = new BenchServer();
  const gone = new AbortController();
  try {
    const hand = await server.hand();
    const { cookie } = await server.hand("lead");
    const request = new Request("http://localhost/", { headers: { cookie }, signal: gone.signal });
    const stream = (await GET(request, { params: Promise.resolve({ id: server.test }) })).body?.getReader();
    if (!stream) throw new Error("central control got no live line");
    await stream.read();
    const times: number[] = [];
    for (const event of readingsOf(hand, count)) {
      const { results } = await server.sent(hand, [event]);
      const answered = performance.now();
      await snapshotWith(stream, results[0]?.serverSeq ?? 0);
      times.push(performance.now() - answered);
    }
    console.log(`From the phone's answer to central control, ${count} events one by one`);
    console.log(
      `  p50 ${percentile(times, 0.5).toFixed(0)} ms, p99 ${percentile(times, 0.99).toFixed(0)} ms; 60 ms of it gather what comes together`,
    );
  } finally {
    gone.abort();
    server.remove();
  }
}

async function snapshotWith(stream: ReadableStreamDefaultReader<Uint8Array>, serverSeq: number): Promise<void> {
  for (;;) {
    const { value, done } = await stream.read();
    if (done) throw new Error("the live line ended");
    const cursor = /^id: (\d+)$/m.exec(new TextDecoder().decode(value))?.[1];
    if (cursor !== undefined && Number(cursor) >= serverSeq) return;
  }
}
