import { LostPage } from "@/components/ui/lost-page";

export default function NotFound() {
  return (
    <LostPage title="There is no such page">
      The address leads nowhere here. A test’s address holds its number; it may have been cut short.
    </LostPage>
  );
}
