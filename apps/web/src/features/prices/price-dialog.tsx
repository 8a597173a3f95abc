import { LINE_GROUPS, PRICE_UNITS, type PriceItem } from "@cleatwork/calc";
import { priceItemSchema } from "@cleatwork/contracts";
import { useState } from "react";
import { todayIn } from "../../lib/format/dates.ts";
import { microText, parseMicro, unitPriceText } from "../../lib/format/money.ts";
import { Button } from "../../ui/button.tsx";
import { Dialog, DialogActions } from "../../ui/dialog.tsx";
import { ContractFormView } from "../../ui/form/contract-form-view.tsx";
import { formParts } from "../../ui/form/form-parts.tsx";
import { useContractForm } from "../../ui/form/use-contract-form.ts";
import { useSession } from "../session/index.ts";
import { groupWords, unitWords } from "./price-words.ts";
import { useSavePrice } from "./use-save-price.ts";

const { Text, Select, Check, Quantity } = formParts<PriceItem>();

export function PriceDialog({
  item,
  taken,
  open,
  onOpenChange,
}: {
  item: PriceItem | null;
  /** Keys that other prices have. */
  taken: ReadonlySet<string>;
  open: boolean;
  onOpenChange: (open: boolean) => void;
}) {
  return (
    <Dialog open={open} onOpenChange={onOpenChange} title={item ? item.description : "New price"}>
      <PriceForm item={item} taken={taken} onDone={() => onOpenChange(false)} />
    </Dialog>
  );
}

function PriceForm({
  item,
  taken,
  onDone,
}: {
  item: PriceItem | null;
  taken: ReadonlySet<string>;
  onDone: () => void;
}) {
  const { company } = useSession();
  const { save, remove } = useSavePrice();
  const [today] = useState(() => todayIn(company.timeZone, Date.now()));
  const contractForm = useContractForm({
    schema: priceItemSchema,
    initial: item ?? {
      key: "",
      description: "",
      group: "devices",
      unit: "ea",
      unitPrice_micro: undefined as unknown as number,
      supplier: "",
      effectiveOn: today,
      taxable: true,
    },
    save: (body) => {
      if (!item && taken.has(body.key)) {
        throw new Error(`There is a price with the key “${body.key}” already. Change that one, or give another key.`);
      }
      return save.mutateAsync({ item: body, before: item });
    },
    onSaved: onDone,
  });
  return (
    <ContractFormView
      contractForm={contractForm}
      actions={
        <DialogActions>
          {item && (
            <Button
              rank="danger"
              className="mr-auto"
              onClick={() => {
                remove.mutate(item);
                onDone();
              }}
            >
              Take it out
            </Button>
          )}
          <Button onClick={onDone}>Cancel</Button>
          <Button type="submit" rank="primary" busy={contractForm.busy}>
            {item ? "Save" : "Add the price"}
          </Button>
        </DialogActions>
      }
    >
      <Text name="description" label="Description" autoComplete="off" autoFocus />
      <Text
        name="key"
        label="Key"
        autoComplete="off"
        disabled={item !== null}
        hint="What the takeoff finds it by: metal:galvanized:24 ga, flexible:8, wrap, liner, hanger, sealant, volume-damper, diffuser-24x24."
      />
      <div className="grid grid-cols-[1fr_7rem] gap-3">
        <Quantity<number>
          name="unitPrice_micro"
          label="Unit price"
          unit={company.currency}
          parse={(text) => {
            const micro = parseMicro(text);
            return micro === null
              ? { ok: false, problems: [{ message: `“${text}” is not a price. Type one such as 1.25.` }] }
              : { ok: true, value: micro };
          }}
          format={(micro) => ({
            text: unitPriceText(micro, company.currency),
            value: microText(micro),
            unit: company.currency,
          })}
        />
        <Select
          name="unit"
          label="For one"
          choices={PRICE_UNITS.map((unit) => ({ value: unit, label: unitWords[unit] }))}
        />
      </div>
      <Select
        name="group"
        label="Group"
        choices={LINE_GROUPS.filter((group) => group !== "labor").map((group) => ({
          value: group,
          label: groupWords[group],
        }))}
      />
      <div className="grid grid-cols-[1fr_10rem] gap-3">
        <Text name="supplier" label="Supplier" autoComplete="off" />
        <Text name="effectiveOn" label="Price of" type="date" />
      </div>
      <Check name="taxable" label="Taxable" />
    </ContractFormView>
  );
}
