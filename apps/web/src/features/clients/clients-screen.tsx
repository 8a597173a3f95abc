import type { Client } from "@cleatwork/contracts";
import { useSuspenseQuery } from "@tanstack/react-query";
import { useState } from "react";
import { addressText } from "../../lib/format/address.ts";
import { useActions } from "../../ui/actions/registry.ts";
import { Button } from "../../ui/button.tsx";
import { EmptyState } from "../../ui/empty-state.tsx";
import { PlusIcon } from "../../ui/icons/icon.tsx";
import { DataTable } from "../../ui/table/data-table.tsx";
import type { TableColumn } from "../../ui/table/table-column.ts";
import { notify } from "../../ui/toast.tsx";
import { useSession } from "../session/index.ts";
import { ClientDialog } from "./client-dialog.tsx";
import { clientQueries } from "./clients.queries.ts";

const columns: readonly TableColumn<Client>[] = [
  { id: "name", head: "Client", value: (client) => client.name, className: "font-[560]" },
  {
    id: "contacts",
    head: "Contacts",
    value: (client) => client.contacts.map((one) => one.name).join(", "),
    csv: { head: "Contacts", value: (client) => client.contacts.map((one) => `${one.name} <${one.email}>`).join("; ") },
  },
  {
    id: "mail",
    head: "First contact's e-mail",
    value: (client) => client.contacts[0]?.email ?? null,
    cell: (client) =>
      client.contacts[0]?.email ? <a href={`mailto:${client.contacts[0].email}`}>{client.contacts[0].email}</a> : null,
  },
  { id: "address", head: "Address", value: (client) => addressText(client.address), className: "text-ink-2" },
  { id: "projects", head: "Projects", align: "right", value: (client) => client.projectCount },
];

/** Who we quote to. */
export function ClientsScreen() {
  const { slug, may } = useSession();
  const { data } = useSuspenseQuery(clientQueries.list(slug));
  const [editing, setEditing] = useState<Client | "new" | null>(null);
  const mayWrite = may("clients.write");
  useActions(
    mayWrite ? [{ id: "new client", label: "New client", group: "Make", keys: "n", run: () => setEditing("new") }] : [],
  );

  const add = mayWrite && (
    <Button size="small" rank="primary" onClick={() => setEditing("new")}>
      <PlusIcon />
      New client
    </Button>
  );
  return (
    <main className="flex min-h-0 flex-1 flex-col p-4">
      <DataTable
        live
        title="Clients"
        fact={`${data.items.length} in all`}
        rows={data.items}
        columns={columns}
        rowId={(client) => client.id}
        sort={{ id: "name", desc: false }}
        csvName="clients"
        actions={add}
        {...(mayWrite ? { onOpen: setEditing } : {})}
        empty={
          <EmptyState title="No clients yet" actions={add}>
            A client is who you quote to: a general contractor, an owner, a school district. Its contacts get the
            quotes.
          </EmptyState>
        }
      />
      <ClientDialog
        client={editing === "new" ? null : editing}
        open={editing !== null}
        onOpenChange={(open) => {
          if (!open) setEditing(null);
        }}
        onSaved={(saved) => notify(`${saved.name} is saved.`, { severity: "good" })}
      />
    </main>
  );
}
