import type { Metadata } from "next";
import { SoundingTask } from "@/components/readings/sounding/sounding-task";

export const dynamic = "force-static";
export const metadata: Metadata = { title: "Soundings" };

export default function Page() {
  return <SoundingTask />;
}
