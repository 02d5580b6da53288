import type { Metadata } from "next";
import { HeldPage } from "@/components/readings/held/held-page";

export const dynamic = "force-static";
export const metadata: Metadata = { title: "What this phone holds" };

export default function Page() {
  return <HeldPage />;
}
