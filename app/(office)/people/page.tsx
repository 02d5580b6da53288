import type { Metadata } from "next";
import { requireAdministrator } from "@/app/access";
import { PeoplePage } from "@/components/people/people-page";
import { database } from "@/db/server/connection";
import { everybodyHere } from "@/db/server/people";

export const metadata: Metadata = { title: "People" };

export default async function Page() {
  await requireAdministrator("/people");
  return <PeoplePage people={everybodyHere(database(), new Date().toISOString())} />;
}
