import { LINE_GROUPS, PRICE_UNITS, parseNumber, type AddedItem, type LineGroup, type PriceUnit } from "@cleatwork/calc";
import { useState } from "react";
import { Button } from "../../ui/button.tsx";
import { CheckField, SelectField, TextField } from "../../ui/controls.tsx";
import { Dialog, DialogActions } from "../../ui/dialog.tsx";
import { groupNames } from "./words.ts";

/** Something that was not drawn: a crane day, a curb, a subcontract. */
export function AddLineDialog({
  item,
  onSave,
  onClose,
}: {
  item: AddedItem | null;
  onSave: (item: AddedItem) => void;
  onClose: () => void;
}) {
  const [description, setDescription] = useState(item?.description ?? "");
  const [group, setGroup] = useState<LineGroup>(item?.group ?? "rentals-freight");
  const [quantity, setQuantity] = useState(item ? String(item.quantity) : "1");
  const [unit, setUnit] = useState<PriceUnit>(item?.unit ?? "ea");
  const [price, setPrice] = useState(item ? String(item.unitPrice_micro / 1_000_000) : "");
  const [taxable, setTaxable] = useState(item?.taxable ?? false);
  const [tried, setTried] = useState(false);
  const quantityValue = parseNumber(quantity);
  const priceValue = parseNumber(price);
  const wrong = {
    description: description.trim() === "" ? "What it is, in a few words." : undefined,
    quantity: quantityValue === null || !(quantityValue > 0) ? `“${quantity}”: a number over zero.` : undefined,
    price: priceValue === null || priceValue < 0 ? `“${price}”: a price such as 1450 or 12.375.` : undefined,
  };
  return (
    <Dialog open title={item ? "Change line" : "Add a line by hand"} onOpenChange={(open) => !open && onClose()}>
      <form
        className="grid gap-3"
        onSubmit={(event) => {
          event.preventDefault();
          setTried(true);
          if (Object.values(wrong).some(Boolean) || quantityValue === null || priceValue === null) return;
          onSave({
            id: item?.id ?? crypto.randomUUID(),
            description: description.trim(),
            group,
            quantity: quantityValue,
            unit,
            unitPrice_micro: Math.round(priceValue * 1_000_000),
            taxable,
          });
        }}
      >
        <TextField
          label="Description"
          value={description}
          maxLength={200}
          error={tried ? wrong.description : undefined}
          onChange={(event) => setDescription(event.target.value)}
        />
        <SelectField
          label="Belongs to"
          value={group}
          onChange={(event) => setGroup(event.target.value as LineGroup)}
          choices={LINE_GROUPS.map((value) => ({ value, label: groupNames[value] }))}
        />
        <div className="grid grid-cols-3 gap-3">
          <TextField
            label="Quantity"
            inputMode="decimal"
            value={quantity}
            error={tried ? wrong.quantity : undefined}
            onChange={(event) => setQuantity(event.target.value)}
          />
          <SelectField
            label="Unit"
            value={unit}
            onChange={(event) => setUnit(event.target.value as PriceUnit)}
            choices={PRICE_UNITS.map((value) => ({ value, label: value }))}
          />
          <TextField
            label="Unit price"
            inputMode="decimal"
            value={price}
            error={tried ? wrong.price : undefined}
            onChange={(event) => setPrice(event.target.value)}
          />
        </div>
        <CheckField label="Taxed" checked={taxable} onChange={(event) => setTaxable(event.target.checked)} />
        <DialogActions>
          <Button onClick={onClose}>Leave it</Button>
          <Button rank="primary" type="submit">
            {item ? "Save line" : "Add line"}
          </Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}
