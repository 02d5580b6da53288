import { startBackups } from "./backup-schedule";
import { database } from "./connection";
import { sessionSecret } from "./secrets";

/** Opens and migrates the database before the first request, and begins its backups; a server that can't is no server and ends. */
export function startServer(): void {
  try {
    process.env.NEXTAUTH_SECRET = sessionSecret();
    process.env.NEXTAUTH_URL ||= `http://localhost:${process.env.PORT ?? 3000}`;
    database();
    startBackups();
  } catch (error) {
    console.error(`Battenbook can't start: ${error instanceof Error ? error.message : String(error)}`);
    process.exit(1);
  }
}
