import { LightSwitch } from "@/components/ui/light-switch";
import { Wordmark } from "@/components/ui/wordmark";
import { Join } from "./join";

/** The first page a new phone sees. */
export function JoinPage() {
  return (
    <div className="mx-auto flex min-h-dvh max-w-hand flex-col">
      <header className="flex items-center justify-between border-ink-line border-b bg-sailcloth-raised px-3 py-1">
        <Wordmark className="text-large" />
        <LightSwitch compact />
      </header>
      <main id="main" className="flex flex-1 flex-col px-4 py-4">
        <Join />
      </main>
    </div>
  );
}
