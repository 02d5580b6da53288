// Runs after `next build`: gathers the precache manifest from .next and public, bundles worker/service-worker.ts to public/service-worker.js.
import { createHash } from "node:crypto";
import { readFile } from "node:fs/promises";
import path from "node:path";
import { getManifest } from "@serwist/build";
import { build } from "esbuild";

const dist = process.env.NEXT_DIST_DIR ?? ".next";
const routes = JSON.parse(await readFile("worker/offline-routes.json", "utf8"));
const md5 = (b) => createHash("md5").update(b).digest("hex");

const { manifestEntries, warnings, count, size } = await getManifest({
  globDirectory: process.cwd(),
  globPatterns: [`${dist}/static/**/*.{js,css,woff2,svg,png,webp,avif,ico,json,wasm}`, "public/**/*"],
  globIgnores: ["public/service-worker.js", "public/pictures/**", "public/schema/**", "**/*.map"],
  dontCacheBustURLsMatching: new RegExp(`^${dist.replaceAll(".", "\\.")}/static/`),
  maximumFileSizeToCacheInBytes: 4 * 1024 * 1024,
  manifestTransforms: [
    (entries) => ({
      manifest: entries.map((e) => ({
        ...e,
        url: e.url.startsWith("public/") ? e.url.slice("public".length) : `/_next/${e.url.slice(dist.length + 1)}`,
      })),
      warnings: [],
    }),
  ],
});
for (const w of warnings) console.warn(w);

const entries = [...(manifestEntries ?? [])];
for (const route of routes) {
  const base = path.join(dist, "server", "app", route === "/" ? "index" : route);
  // throws when a page listed as offline was not prerendered: it is then dynamic, and would not work offline
  entries.push({ url: route, revision: md5(await readFile(`${base}.html`)) });
  entries.push({ url: `${route}?__rsc=full`, revision: md5(await readFile(`${base}.rsc`)) });
  const meta = JSON.parse(await readFile(`${base}.meta`, "utf8"));
  for (const s of meta.segmentPaths ?? []) {
    entries.push({ url: `${route}?__rsc=${encodeURIComponent(s)}`, revision: md5(await readFile(`${base}.segments${s}.segment.rsc`)) });
  }
}

const result = await build({
  entryPoints: ["worker/service-worker.ts"],
  outfile: "public/service-worker.js",
  bundle: true,
  minify: true,
  format: "iife",
  platform: "browser",
  target: "es2022",
  tsconfig: "worker/tsconfig.json",
  define: {
    "self.__SW_MANIFEST": JSON.stringify(entries),
    __OFFLINE_ROUTES__: JSON.stringify(routes),
    "process.env.NODE_ENV": '"production"',
  },
  logLevel: "warning",
});
if (result.errors.length) process.exit(1);
console.log(`service-worker.js: ${entries.length} precache entries, ${count} files, ${Math.round(size / 1024)} KiB`);
