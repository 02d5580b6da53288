import type { Metadata } from "next";
import { MarkTask } from "@/components/readings/marks/mark-task";

export const dynamic = "force-static";
export const metadata: Metadata = { title: "Draft marks" };

export default function Page() {
  return <MarkTask />;
}
