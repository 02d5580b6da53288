import type { Metadata } from "next";
import { PasswordPage } from "@/components/password/password-page";

export const dynamic = "force-static";
export const metadata: Metadata = { title: "Set your password" };

export default function Page() {
  return <PasswordPage />;
}
