import { existsSync, readdirSync } from "node:fs";
import { fileURLToPath } from "node:url";

const app = fileURLToPath(new URL("../../app", import.meta.url));

/** Every route that has a page, as Next finds them in app/: groups leave no trace, parameters keep their brackets. */
export function appRoutes(): readonly string[] {
  return routesUnder("").sort();
}

function routesUnder(folder: string): string[] {
  const here = existsSync(`${app}${folder}/page.tsx`) ? [routeOf(folder)] : [];
  const folders = readdirSync(`${app}${folder}`, { withFileTypes: true }).filter((entry) => entry.isDirectory());
  return [...here, ...folders.flatMap((entry) => routesUnder(`${folder}/${entry.name}`))];
}

function routeOf(folder: string): string {
  return folder.replace(/\/\([^)]*\)/g, "") || "/";
}
