import type { NextRequest } from "next/server";
import NextAuth from "next-auth";
import { authOptions } from "@/app/auth-options";
import { tooManyAttempts } from "@/db/server/sign-in";

type Context = { params: Promise<{ nextauth: string[] }> };

async function handle(request: NextRequest, context: Context): Promise<Response> {
  const response: Response = await NextAuth(request, context, authOptions());
  return (await isThrottled(response)) ? new Response(response.body, { status: 429, headers: response.headers }) : response;
}

async function isThrottled(response: Response): Promise<boolean> {
  return response.status === 401 && (await response.clone().text()).includes(encodeURIComponent(tooManyAttempts));
}

export { handle as GET, handle as POST };
