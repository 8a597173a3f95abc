import { clientRequest, endpoints, makeId, type Client } from "@cleatwork/contracts";
import { useQueryClient } from "@tanstack/react-query";
import { useFieldArray, type Control } from "react-hook-form";
import type { z } from "zod";
import { emptyAddress } from "../../lib/format/address.ts";
import { api } from "../../lib/http.ts";
import { Button, IconButton } from "../../ui/button.tsx";
import { DialogActions } from "../../ui/dialog.tsx";
import { AddressFields } from "../../ui/form/address-fields.tsx";
import { ContractFormView } from "../../ui/form/contract-form-view.tsx";
import { formParts } from "../../ui/form/form-parts.tsx";
import { useContractForm } from "../../ui/form/use-contract-form.ts";
import { PlusIcon, TrashIcon } from "../../ui/icons/icon.tsx";
import { useSession } from "../session/index.ts";
import { clientQueries } from "./clients.queries.ts";

type Values = z.input<typeof clientRequest>;
const { Text, Area } = formParts<Values>();

const newContact = () => ({
  id: makeId("con", { now: Date.now(), random: (bytes) => crypto.getRandomValues(bytes) }),
  name: "",
  email: "",
  phone: "",
  title: "",
});

const valuesOf = ({ name, address, notes, contacts }: Client): Values => ({ name, address, notes, contacts });

/** A client and its people, new or known. */
export function ClientForm({
  client,
  onSaved,
  onCancel,
}: {
  client: Client | null;
  onSaved: (client: Client) => void;
  onCancel: () => void;
}) {
  const { slug } = useSession();
  const cache = useQueryClient();
  const contractForm = useContractForm({
    schema: clientRequest,
    initial: client ? valuesOf(client) : { name: "", address: emptyAddress, notes: "", contacts: [newContact()] },
    version: client?.version ?? 0,
    save: (body, { version, idempotencyKey }) =>
      client
        ? api(endpoints.updateClient, { params: { company: slug, clientId: client.id }, body, version })
        : api(endpoints.createClient, { params: { company: slug }, body, idempotencyKey }),
    onSaved: async (saved) => {
      await cache.invalidateQueries(clientQueries.list(slug));
      onSaved(saved);
    },
    ...(client
      ? {
          reload: async () => {
            const now = await api(endpoints.getClient, { params: { company: slug, clientId: client.id } });
            return { values: valuesOf(now), version: now.version };
          },
        }
      : {}),
  });
  return (
    <ContractFormView
      contractForm={contractForm}
      actions={
        <DialogActions>
          <Button onClick={onCancel}>Cancel</Button>
          <Button type="submit" rank="primary" busy={contractForm.busy}>
            {client ? "Save" : "Add the client"}
          </Button>
        </DialogActions>
      }
    >
      <Text name="name" label="Name" autoComplete="off" />
      <AddressFields prefix="address" legend="Address" />
      <Contacts control={contractForm.form.control} />
      <Area name="notes" label="Notes" hint="Seen by your company only." rows={3} />
    </ContractFormView>
  );
}

function Contacts({ control }: { control: Control<Values, unknown, z.output<typeof clientRequest>> }) {
  const { fields, append, remove } = useFieldArray({ control, name: "contacts", keyName: "key" });
  return (
    <fieldset className="grid gap-3">
      <legend className="label-width mb-2 text-help font-semibold text-ink">Contacts</legend>
      {fields.length === 0 && <p className="text-ink-3">Nobody yet. Quotes are addressed to a contact.</p>}
      {fields.map((contact, index) => (
        <div
          key={contact.key}
          className="grid grid-cols-2 gap-3 border-l-2 border-line pl-3 sm:grid-cols-[1fr_1fr_2rem]"
        >
          <Text name={`contacts.${index}.name`} label="Name" autoComplete="off" />
          <Text name={`contacts.${index}.title`} label="Title" autoComplete="off" />
          <div className="pt-5 max-sm:order-last">
            <IconButton label={`Take contact ${index + 1} out`} onClick={() => remove(index)}>
              <TrashIcon />
            </IconButton>
          </div>
          <Text name={`contacts.${index}.email`} label="E-mail" type="email" autoComplete="off" />
          <Text name={`contacts.${index}.phone`} label="Phone" type="tel" autoComplete="off" />
        </div>
      ))}
      <div>
        <Button size="small" onClick={() => append(newContact())}>
          <PlusIcon />
          Contact
        </Button>
      </div>
    </fieldset>
  );
}
