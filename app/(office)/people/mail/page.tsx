import type { Metadata } from "next";
import { requireAdministrator } from "@/app/access";
import { KeptMailPage } from "@/components/people/kept-mail-page";
import { keptMails } from "@/db/server/mail";

export const metadata: Metadata = { title: "Mail kept here" };

export default async function Page() {
  await requireAdministrator("/people/mail");
  return <KeptMailPage mails={keptMails()} />;
}
