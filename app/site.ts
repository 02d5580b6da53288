/** The address under which people reach this server, as links carry it. */
export function site(request: Request): string {
  return process.env.NEXTAUTH_URL ?? new URL(request.url).origin;
}
