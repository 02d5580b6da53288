import { readdirSync } from "node:fs";
import path from "node:path";

const app = path.resolve(import.meta.dirname, "../../app");

/** Every page and every route handler, as the file system has them: `app/api/health/route.ts`. */
export function routeFiles(): string[] {
  return readdirSync(app, { recursive: true, encoding: "utf8" })
    .filter((file) => /(^|\/)(page\.tsx|route\.ts)$/.test(file))
    .map((file) => `app/${file}`)
    .sort();
}

export type RouteModule = Record<string, unknown>;

export function routeModule(file: string): Promise<RouteModule> {
  return import(path.resolve(app, "..", file));
}
