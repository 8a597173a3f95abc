import { companyRequest, endpoints, type Company } from "@cleatwork/contracts";
import { useQueryClient } from "@tanstack/react-query";
import { useFormContext, useWatch } from "react-hook-form";
import type { z } from "zod";
import { api } from "../../lib/http.ts";
import { timeZoneChoices } from "../../lib/format/time-zones.ts";
import { Button } from "../../ui/button.tsx";
import { AddressFields } from "../../ui/form/address-fields.tsx";
import { ContractFormView } from "../../ui/form/contract-form-view.tsx";
import { formParts } from "../../ui/form/form-parts.tsx";
import { useContractForm } from "../../ui/form/use-contract-form.ts";
import { Panel, PanelBody, PanelHead } from "../../ui/panel.tsx";
import { notify } from "../../ui/toast.tsx";
import { sessionQueries, useSession } from "../session/index.ts";
import { Letterhead } from "./letterhead.tsx";

type Values = z.input<typeof companyRequest>;
const { Text, Area, Select } = formParts<Values>();

const valuesOf = (company: Company): Values => ({
  name: company.name,
  unitSystem: company.unitSystem,
  timeZone: company.timeZone,
  address: company.address,
  phone: company.phone,
  licenseNumber: company.licenseNumber,
  brandColor: company.brandColor,
  frictionBasis: company.frictionBasis,
  quoteTerms: company.quoteTerms,
});

/** Name, units, brand and terms: what stands on every quote. */
export function SettingsForm() {
  const { slug, company, may } = useSession();
  const cache = useQueryClient();
  const mayWrite = may("company.write");
  const contractForm = useContractForm({
    schema: companyRequest,
    initial: valuesOf(company),
    version: company.version,
    save: (body, { version }) => api(endpoints.updateCompany, { params: { company: slug }, body, version }),
    onSaved: async (saved) => {
      cache.setQueryData(sessionQueries.company(slug).queryKey, saved);
      notify("The company's settings are saved.", { severity: "good" });
      await cache.invalidateQueries({ queryKey: sessionQueries.me().queryKey });
    },
    reload: async () => {
      const now = await api(endpoints.getCompany, { params: { company: slug } });
      cache.setQueryData(sessionQueries.company(slug).queryKey, now);
      return { values: valuesOf(now), version: now.version };
    },
  });
  return (
    <ContractFormView
      contractForm={contractForm}
      guard
      label="Company settings"
      actions={
        mayWrite ? (
          <div className="sticky bottom-0 flex gap-2 border-t border-line bg-ground py-3">
            <Button type="submit" rank="primary" busy={contractForm.busy}>
              Save
            </Button>
          </div>
        ) : (
          <p className="text-ink-2">An owner of the company can change these.</p>
        )
      }
    >
      <fieldset disabled={!mayWrite} className="grid items-start gap-4 lg:grid-cols-2">
        <legend className="sr-only">Company settings</legend>
        <div className="grid gap-4">
          <Panel live>
            <PanelHead title="Company" />
            <PanelBody className="grid gap-4">
              <Text name="name" label="Name" />
              <AddressFields prefix="address" legend="Address" />
              <div className="grid grid-cols-2 gap-3">
                <Text name="phone" label="Phone" type="tel" />
                <Text name="licenseNumber" label="License number" />
              </div>
            </PanelBody>
          </Panel>
          <Panel>
            <PanelHead title="Units and time" fact="what new projects start with" />
            <PanelBody className="grid gap-3 sm:grid-cols-2">
              <Select
                name="unitSystem"
                label="Units"
                choices={[
                  { value: "inch-pound", label: "Inches, cfm, pounds" },
                  { value: "si", label: "Millimeters, L/s, kilograms" },
                ]}
              />
              <Select name="timeZone" label="Time zone" choices={timeZoneChoices(company.timeZone)} />
            </PanelBody>
          </Panel>
          <Panel>
            <PanelHead title="Air" fact="of every project, from now on" />
            <PanelBody className="grid gap-2">
              <Select
                name="frictionBasis"
                label="Turbulent friction goes by the"
                choices={[
                  { value: "hydraulic-diameter", label: "hydraulic diameter" },
                  { value: "laminar-equivalent-diameter", label: "laminar-equivalent diameter (Jones)" },
                ]}
              />
              <p className="text-help text-ink-3">
                Round duct is the same on both; flat rectangles and annuli lose a few percent more on the second. Each
                duct shows the other figure beside its own. Issued quotes keep what they were computed on.
              </p>
            </PanelBody>
          </Panel>
        </div>
        <Panel>
          <PanelHead title="Brand and terms" fact="of quotes, their PDF and the client's page" />
          <PanelBody className="grid gap-4">
            <Brand />
            <Area name="quoteTerms" label="Terms that new quotes start with" rows={10} />
          </PanelBody>
        </Panel>
      </fieldset>
    </ContractFormView>
  );
}

function Brand() {
  const { setValue } = useFormContext<Values>();
  const [color, name, phone, license] = useWatch<Values, ["brandColor", "name", "phone", "licenseNumber"]>({
    name: ["brandColor", "name", "phone", "licenseNumber"],
  });
  const valid = /^#[0-9a-f]{6}$/i.test(color);
  return (
    <div className="grid gap-3">
      <div className="flex items-end gap-2">
        <Text name="brandColor" label="Brand color" className="flex-1" autoComplete="off" spellCheck={false} />
        <input
          type="color"
          aria-label="Pick the brand color"
          value={valid ? color.toLowerCase() : "#000000"}
          onChange={(event) =>
            setValue("brandColor", event.target.value.toUpperCase(), { shouldDirty: true, shouldValidate: true })
          }
          className="h-8 w-12 rounded-edge border border-line-strong bg-sheet-hi p-0.5"
        />
      </div>
      {valid && <Letterhead color={color} name={name} line={[phone, license].filter(Boolean).join(" · ")} />}
    </div>
  );
}
