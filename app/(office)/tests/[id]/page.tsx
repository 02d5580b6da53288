import type { Metadata } from "next";
import { everybody, requireRole } from "@/app/access";
import { TestOverview } from "@/components/tests/test-overview";

export const metadata: Metadata = { title: "Test" };

export default async function Page({ params }: { params: Promise<{ id: string }> }) {
  const { id } = await params;
  const { test, roles } = await requireRole(id, everybody, `/tests/${id}`);
  return <TestOverview test={{ ...test, roles, vessel: test.vesselCopy.vessel.name }} />;
}
