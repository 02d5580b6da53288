import type { Metadata } from "next";
import { OfflinePage } from "@/components/readings/shell/offline-page";

export const dynamic = "force-static";
export const metadata: Metadata = { title: "No answer" };

export default function Page() {
  return <OfflinePage />;
}
