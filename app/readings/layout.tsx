import type { ReactNode } from "react";
import { ReadingsShell } from "@/components/readings/shell/readings-shell";

export default function Layout({ children }: { children: ReactNode }) {
  return <ReadingsShell>{children}</ReadingsShell>;
}
