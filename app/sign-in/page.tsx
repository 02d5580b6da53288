import type { Metadata } from "next";
import { SignInPage } from "@/components/sign-in/sign-in-page";

export const metadata: Metadata = { title: "Sign in" };

export default async function Page({ searchParams }: { searchParams: Promise<{ next?: string | string[] }> }) {
  const { next } = await searchParams;
  return <SignInPage next={typeof next === "string" ? next : null} />;
}
