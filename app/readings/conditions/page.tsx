import type { Metadata } from "next";
import { ConditionsTask } from "@/components/readings/conditions/conditions-task";

export const dynamic = "force-static";
export const metadata: Metadata = { title: "Conditions and notes" };

export default function Page() {
  return <ConditionsTask />;
}
