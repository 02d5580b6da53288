import type { Metadata } from "next";
import { BattenTask } from "@/components/readings/batten/batten-task";

export const dynamic = "force-static";
export const metadata: Metadata = { title: "Batten" };

export default function Page() {
  return <BattenTask />;
}
