import type { Metadata } from "next";
import { JoinPage } from "@/components/join/join-page";

export const dynamic = "force-static";
export const metadata: Metadata = { title: "Enrol this phone" };

export default function Page() {
  return <JoinPage />;
}
