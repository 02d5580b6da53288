import Link from "next/link";
import { Cell, ColumnHead, DataTable, RowHead } from "@/components/ui/data-table";
import type { Role } from "@/lib/sync/job-sheet";

export type PersonLine = {
  readonly id: string;
  readonly name: string;
  readonly email: string | null;
  readonly isAdministrator: boolean;
  readonly isEngineer: boolean;
  readonly isClosed: boolean;
  readonly hasPassword: boolean;
  readonly parts: readonly { readonly test: string; readonly title: string; readonly role: Role }[];
  readonly phones: number;
};

/** A row for each account: who, what they may do on this server, where they have a part. */
export function PeopleTable({ people }: { people: readonly PersonLine[] }) {
  if (people.length === 0) return <p>Nobody fits what you look for.</p>;
  return (
    <DataTable caption="Accounts" className="min-w-[44rem]">
      <thead>
        <tr>
          <ColumnHead>Name</ColumnHead>
          <ColumnHead>E-mail</ColumnHead>
          <ColumnHead>On this server</ColumnHead>
          <ColumnHead>In tests</ColumnHead>
          <ColumnHead figure>Phones</ColumnHead>
        </tr>
      </thead>
      <tbody>
        {people.map((person) => (
          <tr key={person.id} className={person.isClosed ? "text-ink-soft" : ""}>
            <RowHead>
              <Link
                href={`/people/${person.id}`}
                prefetch={false}
                className="inline-flex min-h-tap items-center underline decoration-ink-line underline-offset-4 hover:decoration-ink"
              >
                {person.name}
              </Link>
            </RowHead>
            <Cell>{person.email ?? "none"}</Cell>
            <Cell>{standingInWords(person)}</Cell>
            <Cell>{partsInWords(person)}</Cell>
            <Cell figure>{person.phones}</Cell>
          </tr>
        ))}
      </tbody>
    </DataTable>
  );
}

export function standingInWords({ isAdministrator, isEngineer, isClosed, hasPassword, email }: PersonLine): string {
  if (isClosed) return "closed";
  const may = [isAdministrator ? "administrator" : null, isEngineer ? "engineer" : null].filter((word) => word !== null);
  const pending = email !== null && !hasPassword ? "invited, no password yet" : null;
  const words = [...may, ...(pending ? [pending] : [])];
  return words.length === 0 ? "–" : words.join(", ");
}

function partsInWords({ parts }: PersonLine): string {
  if (parts.length === 0) return "none";
  const [first, ...others] = parts;
  const words = `${first?.role}: ${first?.title}`;
  return others.length === 0 ? words : `${words}, and ${others.length} more`;
}
