import type { ReactNode } from "react";
import { signedInPerson } from "@/app/session";
import { OfficeShell } from "@/components/ui/office-shell";

export default async function Layout({ children }: { children: ReactNode }) {
  const person = await signedInPerson();
  return <OfficeShell person={person}>{children}</OfficeShell>;
}
