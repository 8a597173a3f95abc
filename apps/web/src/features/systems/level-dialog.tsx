import { formatElevation, meters, METERS_PER_INCH, parseLength, parseNumber, type Meters } from "@cleatwork/calc";
import type { Drawing, DrawingId, LevelRecord, Underlay } from "@cleatwork/contracts";
import { addLevel, removeLevel, setLevel } from "@cleatwork/layout";
import { useState } from "react";
import { Button } from "../../ui/button.tsx";
import { SelectField, TextField } from "../../ui/controls.tsx";
import { Dialog, DialogActions } from "../../ui/dialog.tsx";
import { QuantityField } from "../../ui/quantity-field.tsx";
import { browserIds, useWorkspace } from "../workspace/index.ts";

/** PDF user space has 72 units to the inch (ISO 32000-1, 8.3.2.3). */
const POINTS_PER_INCH = 72;

/** A floor: its name, its height, and the drawing page that lies under it at a stated scale. */
export function LevelDialog({
  level,
  drawings,
  onClose,
}: {
  level: LevelRecord | null;
  drawings: readonly Drawing[];
  onClose: (levelId: string | null) => void;
}) {
  const { units, run } = useWorkspace();
  const [name, setName] = useState(level?.name ?? "");
  const [elevation, setElevation] = useState<Meters>(level?.elevation_m ?? meters(0));
  const [drawingId, setDrawingId] = useState<string>(level?.underlay?.drawingId ?? "");
  const [page, setPage] = useState(String(level?.underlay?.page ?? 1));
  const [ratio, setRatio] = useState(
    level?.underlay ? String(Math.round(ratioOf(level.underlay.metersPerUnit))) : "96",
  );
  const drawing = drawings.find(({ id }) => id === drawingId);
  const ratioValue = parseNumber(ratio);
  const pageValue = Number(page);
  const wrongRatio = drawingId !== "" && !(ratioValue !== null && ratioValue > 0);
  const wrongPage =
    drawing !== undefined && !(Number.isInteger(pageValue) && pageValue >= 1 && pageValue <= drawing.pageCount);

  const save = () => {
    if (name.trim() === "" || wrongRatio || wrongPage) return;
    const underlay: Underlay | null =
      drawing && ratioValue !== null
        ? {
            drawingId: drawing.id satisfies DrawingId,
            page: pageValue,
            metersPerUnit: (ratioValue * METERS_PER_INCH) / POINTS_PER_INCH,
            x_m: level?.underlay?.x_m ?? meters(0),
            y_m: level?.underlay?.y_m ?? meters(0),
            rotation_rad: level?.underlay?.rotation_rad ?? 0,
          }
        : null;
    if (level) {
      run((layout) =>
        setLevel(layout, { id: level.id, fields: { name: name.trim(), elevation_m: elevation, underlay } }),
      );
      return onClose(level.id);
    }
    const id = browserIds.level();
    const made = run((layout) => addLevel(layout, { name: name.trim(), elevation_m: elevation }, { level: () => id }));
    if (made.ok && underlay) run((layout) => setLevel(layout, { id, fields: { underlay } }));
    if (made.ok) onClose(id);
  };

  return (
    <Dialog open title={level ? level.name : "New level"} onOpenChange={(open) => !open && onClose(null)}>
      <form
        className="grid gap-3"
        onSubmit={(event) => {
          event.preventDefault();
          save();
        }}
      >
        <TextField
          label="Name"
          value={name}
          maxLength={80}
          error={name.trim() === "" ? "A name such as Level 2." : undefined}
          onChange={(event) => setName(event.target.value)}
        />
        <QuantityField
          label="Floor above the datum"
          value={elevation}
          parse={(text) => (text.trim() === "0" ? { ok: true, value: meters(0) } : parseLength(text, units))}
          format={(value) => formatElevation(value, units)}
          onChange={(value) => value !== null && setElevation(value)}
        />
        <SelectField
          label="Drawing under it"
          value={drawingId}
          onChange={(event) => setDrawingId(event.target.value)}
          choices={[
            { value: "", label: drawings.length === 0 ? "None uploaded yet" : "None" },
            ...drawings.map(({ id, sheetNumber, revision, title }) => ({
              value: id,
              label: `${sheetNumber} rev ${revision || "–"} ${title}`,
            })),
          ]}
        />
        {drawing && (
          <div className="grid grid-cols-2 gap-3">
            <TextField
              label="Page"
              value={page}
              inputMode="numeric"
              error={wrongPage ? `1 to ${drawing.pageCount}.` : undefined}
              onChange={(event) => setPage(event.target.value)}
            />
            <TextField
              label="Scale, 1 to"
              value={ratio}
              inputMode="decimal"
              hint="96 is 1/8 in. to the foot, 48 is 1/4 in."
              error={wrongRatio ? "A number such as 96." : undefined}
              onChange={(event) => setRatio(event.target.value)}
            />
          </div>
        )}
        <DialogActions>
          {level && (
            <Button
              rank="danger"
              onClick={() => {
                if (run((layout) => removeLevel(layout, { id: level.id })).ok) onClose(null);
              }}
            >
              Remove level
            </Button>
          )}
          <Button onClick={() => onClose(null)}>Leave it</Button>
          <Button rank="primary" type="submit">
            {level ? "Save level" : "Add level"}
          </Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}

const ratioOf = (metersPerUnit: number) => (metersPerUnit * POINTS_PER_INCH) / METERS_PER_INCH;
