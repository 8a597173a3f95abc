import type { ProjectValues } from "./project-values.ts";
import { formatElevation, parseNumber } from "@cleatwork/calc/display/index";
import { feet, meters, type Meters } from "@cleatwork/calc";
import type { projectRequest } from "@cleatwork/contracts";
import { type Client, type Project, type UnitSystem } from "@cleatwork/contracts";
import { useSuspenseQuery } from "@tanstack/react-query";
import { useState, type ReactNode } from "react";
import { useFormContext, useWatch } from "react-hook-form";
import type { z } from "zod";
import { AddressFields } from "../../ui/form/address-fields.tsx";
import { ContractFormView } from "../../ui/form/contract-form-view.tsx";
import { formParts } from "../../ui/form/form-parts.tsx";
import type { ContractForm } from "../../ui/form/use-contract-form.ts";
import type { Understood } from "../../ui/quantity-field.tsx";
import { ClientDialog, clientQueries } from "../clients/index.ts";
import { useSession } from "../session/index.ts";
import { DueField } from "./due-field.tsx";

const { Text, Select, Quantity } = formParts<ProjectValues>();

export const projectValues = (project: Project): ProjectValues => ({
  name: project.name,
  number: project.number,
  clientId: project.clientId,
  contactId: project.contactId,
  siteAddress: project.siteAddress,
  altitude_m: project.altitude_m,
  dueAt: project.dueAt,
  dueZone: project.dueZone,
  unitSystem: project.unitSystem,
});

/** What a project is, before anything is drawn. */
export function ProjectForm({
  contractForm,
  actions,
}: {
  contractForm: ContractForm<ProjectValues, z.output<typeof projectRequest>>;
  actions: ReactNode;
}) {
  return (
    <ContractFormView contractForm={contractForm} guard actions={actions} label="About the project" className="gap-6!">
      <div className="grid gap-3 sm:grid-cols-[1fr_10rem]">
        <Text name="name" label="Project" autoComplete="off" />
        <Text name="number" label="Your number for it" autoComplete="off" />
      </div>
      <ClientFields />
      <DueField />
      <AddressFields prefix="siteAddress" legend="Site" />
      <UnitFields />
    </ContractFormView>
  );
}

function ClientFields() {
  const { slug } = useSession();
  const { data } = useSuspenseQuery(clientQueries.list(slug));
  const { setValue } = useFormContext<ProjectValues>();
  const clientId = useWatch<ProjectValues, "clientId">({ name: "clientId" });
  const [adding, setAdding] = useState(false);
  const client = data.items.find((one) => one.id === clientId);

  const choose = (chosen: Client) => {
    setValue("clientId", chosen.id, { shouldDirty: true, shouldValidate: true });
    setValue("contactId", chosen.contacts[0]?.id ?? null, { shouldDirty: true });
  };
  return (
    <>
      <div className="grid items-start gap-3 sm:grid-cols-2">
        <Select
          name="clientId"
          label="Client"
          empty="Choose a client"
          // A contact of another client is none.
          onChosen={(id) => setValue("contactId", data.items.find((one) => one.id === id)?.contacts[0]?.id ?? null)}
          choices={data.items.map((one) => ({ value: one.id, label: one.name }))}
          aside={
            <button
              type="button"
              className="inline-flex items-center gap-1 text-help text-dye-ink underline underline-offset-3"
              onClick={() => setAdding(true)}
            >
              New client
            </button>
          }
        />
        <ContactField client={client} />
      </div>
      <ClientDialog client={null} open={adding} onOpenChange={setAdding} onSaved={choose} />
    </>
  );
}

function ContactField({ client }: { client: Client | undefined }) {
  const contacts = client?.contacts ?? [];
  return (
    <Select
      name="contactId"
      emptyIs={null}
      label="Contact"
      empty={client ? "Nobody in particular" : "Choose the client first"}
      choices={contacts.map((one) => ({ value: one.id, label: one.title ? `${one.name}, ${one.title}` : one.name }))}
    />
  );
}

function UnitFields() {
  const units = useWatch<ProjectValues, "unitSystem">({ name: "unitSystem" });
  return (
    <div className="grid items-start gap-3 sm:grid-cols-2">
      <Quantity<Meters>
        name="altitude_m"
        label="Altitude of the site"
        parse={(text) => parseAltitude(text, units)}
        format={(value) => formatElevation(value, units)}
        hint="Thinner air loses less pressure."
      />
      <Select
        name="unitSystem"
        label="Units"
        choices={[
          { value: "inch-pound", label: "Inches, cfm, pounds" },
          { value: "si", label: "Millimeters, L/s, kilograms" },
        ]}
      />
    </div>
  );
}

/** A bare number is feet or meters, never inches: nobody gives an altitude in inches. */
function parseAltitude(text: string, units: UnitSystem): Understood<Meters> {
  const typed = /^(.*?)\s*(ft|feet|'|m|meters)?\.?$/i.exec(text.trim());
  const number = parseNumber(typed?.[1] ?? "");
  if (number === null) {
    return {
      ok: false,
      problems: [{ message: `“${text.trim()}” cannot be read. Type ${units === "si" ? "410" : "1340"}.` }],
    };
  }
  const inMeters = typed?.[2] ? /^m/i.test(typed[2]) : units === "si";
  return { ok: true, value: inMeters ? meters(number) : feet(number) };
}
