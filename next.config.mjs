/** @type {import("next").NextConfig} */
export default {
  distDir: process.env.NEXT_DIST_DIR ?? ".next",
  serverExternalPackages: ["better-sqlite3", "nodemailer"],
  poweredByHeader: false,
  experimental: { authInterrupts: true },
  async headers() {
    return [{ source: "/service-worker.js", headers: [{ key: "Cache-Control", value: "no-cache, no-store" }] }];
  },
};
