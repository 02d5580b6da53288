import type { Metadata } from "next";
import { WaterTask } from "@/components/readings/water/water-task";

export const dynamic = "force-static";
export const metadata: Metadata = { title: "Water" };

export default function Page() {
  return <WaterTask />;
}
