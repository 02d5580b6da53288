import { Start } from "@/components/start/start";
import { PageHeader } from "@/components/ui/page-header";

export const dynamic = "force-static";

export default function Page() {
  return (
    <>
      <PageHeader home="/" />
      <Start />
    </>
  );
}
