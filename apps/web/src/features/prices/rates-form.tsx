import { endpoints, pricingSettingsRequest, type PricingSettings } from "@cleatwork/contracts";
import { useQueryClient, useSuspenseQuery } from "@tanstack/react-query";
import { useFieldArray, useWatch } from "react-hook-form";
import type { z } from "zod";
import { microText, parseMicro, unitPriceText } from "../../lib/format/money.ts";
import { parsePercent, percentText } from "../../lib/format/percent.ts";
import { api } from "../../lib/http.ts";
import { Button, IconButton } from "../../ui/button.tsx";
import { ContractFormView } from "../../ui/form/contract-form-view.tsx";
import { formParts } from "../../ui/form/form-parts.tsx";
import { useContractForm } from "../../ui/form/use-contract-form.ts";
import { PlusIcon, TrashIcon } from "../../ui/icons/icon.tsx";
import { Panel, PanelBody, PanelHead } from "../../ui/panel.tsx";
import type { Understood } from "../../ui/quantity-field.tsx";
import { notify } from "../../ui/toast.tsx";
import { useSession } from "../session/index.ts";
import { priceQueries } from "./prices.queries.ts";

type Values = z.input<typeof pricingSettingsRequest>;
const { Text, Quantity } = formParts<Values>();

const valuesOf = ({ labor, rates, staleAfterDays, marginFloor_bp, conditionFactor }: PricingSettings): Values => ({
  labor,
  rates,
  staleAfterDays,
  marginFloor_bp,
  conditionFactor,
});

/** What an hour costs, and what is added to cost to make a price. */
export function RatesForm() {
  const { slug, may } = useSession();
  const { data: settings } = useSuspenseQuery(priceQueries.settings(slug));
  const cache = useQueryClient();
  const mayWrite = may("prices.write");
  const contractForm = useContractForm({
    schema: pricingSettingsRequest,
    initial: valuesOf(settings),
    version: settings.version,
    save: (body, { version }) => api(endpoints.updatePricingSettings, { params: { company: slug }, body, version }),
    onSaved: (saved) => {
      cache.setQueryData(priceQueries.settings(slug).queryKey, saved);
      notify("Labor and percentages are saved. Issued quotes keep theirs.", { severity: "good" });
    },
    reload: async () => {
      const now = await api(endpoints.getPricingSettings, { params: { company: slug } });
      cache.setQueryData(priceQueries.settings(slug).queryKey, now);
      return { values: valuesOf(now), version: now.version };
    },
  });
  return (
    <ContractFormView
      contractForm={contractForm}
      guard
      label="Labor and percentages"
      actions={
        mayWrite ? (
          <div className="sticky bottom-0 border-t border-line bg-ground py-3">
            <Button type="submit" rank="primary" busy={contractForm.busy}>
              Save
            </Button>
          </div>
        ) : (
          <p className="text-ink-2">An owner of the company can change these.</p>
        )
      }
    >
      <fieldset disabled={!mayWrite} className="grid items-start gap-4 xl:grid-cols-3">
        <legend className="sr-only">Labor and percentages</legend>
        <LaborRate index={0} mayWrite={mayWrite} />
        <LaborRate index={1} mayWrite={mayWrite} />
        <div className="grid gap-4">
          <FromCostToPrice />
          <Watches />
        </div>
      </fieldset>
    </ContractFormView>
  );
}

function FromCostToPrice() {
  return (
    <Panel>
      <PanelHead title="From cost to price" fact="in this order" />
      <PanelBody className="grid grid-cols-2 items-start gap-3">
        <Percent name="rates.wasteOnMetal_bp" label="Waste on metal" hint="On the net pounds." />
        <Percent name="rates.tax_bp" label="Sales tax" hint="On what is marked taxable." />
        <Percent name="rates.overhead_bp" label="Overhead" hint="On cost." />
        <Percent name="rates.contingency_bp" label="Contingency" hint="On cost." />
        <Percent name="rates.profit_bp" label="Profit" hint="Markup, over cost. Every price shows the margin too." />
        <Percent name="rates.bond_bp" label="Bond" hint="Of the price." />
      </PanelBody>
    </Panel>
  );
}

function Watches() {
  return (
    <Panel>
      <PanelHead title="Conditions and warnings" />
      <PanelBody className="grid grid-cols-2 items-start gap-3">
        <Quantity<number>
          name="conditionFactor"
          label="Field hours, times"
          hint="1 is a usual job; more for height, congestion, an occupied building."
          parse={(text) => parsePlain(text, "1.15")}
          format={(value) => ({ text: `× ${value}`, value: String(value), unit: "×" })}
        />
        <Percent name="marginFloor_bp" label="Margin floor" hint="A price under this is pointed out." />
        <Quantity<number>
          name="staleAfterDays"
          label="A price is old after"
          parse={(text) => parsePlain(text, "60")}
          format={(value) => ({ text: `${value} days`, value: String(value), unit: "days" })}
        />
      </PanelBody>
    </Panel>
  );
}

function parsePlain(text: string, example: string): Understood<number> {
  const value = Number(text.trim());
  return Number.isFinite(value)
    ? { ok: true, value }
    : { ok: false, problems: [{ message: `“${text}” is not a number. Type one such as ${example}.` }] };
}

function Percent({
  name,
  label,
  hint,
}: {
  name: "marginFloor_bp" | `rates.${keyof Values["rates"]}`;
  label: string;
  hint?: string;
}) {
  return (
    <Quantity<number>
      name={name}
      label={label}
      hint={hint}
      parse={(text) => {
        const value = parsePercent(text);
        return value === null
          ? { ok: false, problems: [{ message: `“${text}” is not a percentage. Type one such as 12.5.` }] }
          : { ok: true, value };
      }}
      format={(value) => ({ text: percentText(value), value: String(value / 100), unit: "%" })}
    />
  );
}

/** One kind of hour, built up from wage and what comes on top of it. */
function LaborRate({ index, mayWrite }: { index: 0 | 1; mayWrite: boolean }) {
  const { company } = useSession();
  const parts = useFieldArray<Values, `labor.${0 | 1}.parts`>({ name: `labor.${index}.parts` });
  const rate = useWatch<Values, `labor.${0 | 1}`>({ name: `labor.${index}` });
  const sum = rate.parts.reduce((total, part) => total + (part.amount_micro ?? 0), 0);
  return (
    <Panel>
      <PanelHead
        title={rate.key === "shop" ? "Shop hour" : "Field hour"}
        fact={`${unitPriceText(sum, company.currency)} an hour`}
      />
      <PanelBody className="grid gap-3">
        <Text name={`labor.${index}.name`} label="Name" />
        {parts.fields.map((part, at) => (
          <div key={part.id} className="grid grid-cols-[1fr_8rem_2rem] items-start gap-2">
            <Text name={`labor.${index}.parts.${at}.label`} label="Part" hideLabel={at > 0} />
            <Quantity<number>
              name={`labor.${index}.parts.${at}.amount_micro`}
              label="An hour"
              hideLabel={at > 0}
              unit={company.currency}
              parse={(text) => {
                const micro = parseMicro(text);
                return micro === null
                  ? { ok: false, problems: [{ message: `“${text}” is not an amount. Type one such as 41.50.` }] }
                  : { ok: true, value: micro };
              }}
              format={(micro) => ({
                text: unitPriceText(micro, company.currency),
                value: microText(micro),
                unit: company.currency,
              })}
            />
            <div className={at > 0 ? "" : "pt-5"}>
              {mayWrite && (
                <IconButton label={`Take ${part.label || "this part"} out`} onClick={() => parts.remove(at)}>
                  <TrashIcon />
                </IconButton>
              )}
            </div>
          </div>
        ))}
        {mayWrite && (
          <div>
            <Button
              size="small"
              onClick={() => parts.append({ label: "", amount_micro: undefined as unknown as number })}
            >
              <PlusIcon />
              Part
            </Button>
          </div>
        )}
        <p className="flex justify-between border-t border-line-strong pt-2 font-[640]">
          <span>Cost of an hour</span>
          <span>{unitPriceText(sum, company.currency)}</span>
        </p>
      </PanelBody>
    </Panel>
  );
}
