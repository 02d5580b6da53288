import { readFileSync } from "node:fs";

// what a phone runs is told by name: two versions can be about on one day
const version = process.env.BATTENBOOK_VERSION ?? JSON.parse(readFileSync(new URL("package.json", import.meta.url), "utf8")).version;

/** @type {import("next").NextConfig} */
export default {
  distDir: process.env.NEXT_DIST_DIR ?? ".next",
  serverExternalPackages: ["better-sqlite3", "nodemailer"],
  env: { BATTENBOOK_VERSION: version },
  poweredByHeader: false,
  experimental: { authInterrupts: true },
  async headers() {
    return [{ source: "/service-worker.js", headers: [{ key: "Cache-Control", value: "no-cache, no-store" }] }];
  },
};
