const usual = "/tests";

/** Where to go after signing in: a path of this server and of no other. */
export function pathWithin(next: string | null): string {
  if (next === null || !/^\/(?![/\\])/.test(next)) return usual;
  const here = "https://here.invalid";
  const { origin, pathname, search } = new URL(next, here);
  return origin === here ? pathname + search : usual;
}
