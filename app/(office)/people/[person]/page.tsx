import type { Metadata } from "next";
import { notFound } from "next/navigation";
import { requireAdministrator } from "@/app/access";
import { PersonPage } from "@/components/people/person-page";
import { database } from "@/db/server/connection";
import { personShown } from "@/db/server/people";
import { everyTest } from "@/db/server/tests";

export const metadata: Metadata = { title: "Person" };

export default async function Page({ params }: { params: Promise<{ person: string }> }) {
  const { person: id } = await params;
  const administrator = await requireAdministrator(`/people/${id}`);
  const person = personShown(database(), id, new Date().toISOString());
  if (!person) notFound();
  const tests = everyTest(database()).map(({ id, title, date }) => ({ id, title, date }));
  return <PersonPage person={person} tests={tests} isSelf={administrator.id === id} />;
}
