import type { Metadata } from "next";
import { DueBoard } from "@/components/readings/due/due-board";

export const dynamic = "force-static";
export const metadata: Metadata = { title: "Readings due" };

export default function Page() {
  return <DueBoard />;
}
