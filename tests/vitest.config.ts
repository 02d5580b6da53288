import path from "node:path";
import { fileURLToPath } from "node:url";
import react from "@vitejs/plugin-react";
import { defineConfig } from "vitest/config";

const root = fileURLToPath(new URL("..", import.meta.url));
const alias = {
  "@": root,
  "server-only": path.join(root, "node_modules/server-only/empty.js"),
  "client-only": path.join(root, "node_modules/client-only/index.js"),
};

export default defineConfig({
  root,
  plugins: [react()],
  resolve: { alias },
  test: {
    // what a rule found is read whole, not as "[ …(7) ]"
    chaiConfig: { truncateThreshold: 0 },
    projects: [
      {
        extends: true,
        test: {
          name: "node",
          environment: "node",
          include: ["tests/{lib,db,worker,published,architecture,faults,app}/**/*.test.ts"],
          setupFiles: ["fake-indexeddb/auto"],
          testTimeout: 30_000,
        },
      },
      { extends: true, test: { name: "components", environment: "happy-dom", include: ["tests/components/**/*.test.{ts,tsx}"] } },
    ],
  },
});
