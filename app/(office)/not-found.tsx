import { LostWords } from "@/components/ui/lost-words";

export default function NotFound() {
  return (
    <LostWords title="There is no such test here">
      The address names none of this server: it may have been cut short, or belong to another server.
    </LostWords>
  );
}
