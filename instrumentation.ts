/** Called once by Next when the server starts. */
export async function register(): Promise<void> {
  if (process.env.NEXT_RUNTIME !== "nodejs" || process.env.NEXT_PHASE === "phase-production-build") return;
  const { startServer } = await import("./db/server/start");
  startServer();
  const { watchForEnding } = await import("./db/server/ending");
  watchForEnding();
}
