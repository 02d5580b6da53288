import { PageHeader } from "@/components/ui/page-header";
import { PageTitle } from "@/components/ui/page-title";
import { Password } from "./password";

/** Where a link leads by which a person sets a password; without one, where to ask for it. */
export function PasswordPage() {
  return (
    <>
      <PageHeader home="/" />
      <main id="main" className="mx-auto max-w-hand px-4 py-8">
        <PageTitle title="Your password" over="Lead, engineer, witness, administrator" />
        <Password />
      </main>
    </>
  );
}
