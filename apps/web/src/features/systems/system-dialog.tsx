import {
  DUCT_CLASSES,
  SERVICES,
  degreesFahrenheit,
  feet,
  feetPerMinute,
  formatFrictionRate,
  formatLength,
  formatPressure,
  formatTemperature,
  formatVelocity,
  inchesOfWater,
  inchesOfWaterPer100Feet,
  meters,
  parseFrictionRate,
  parseLength,
  parsePressure,
  parseTemperature,
  parseVelocity,
  type DuctClass,
  type Service,
} from "@cleatwork/calc";
import type { SpecId, SystemRecord } from "@cleatwork/contracts";
import { addSystem, setSystem } from "@cleatwork/layout";
import { useSuspenseQuery } from "@tanstack/react-query";
import { useState } from "react";
import { Button } from "../../ui/button.tsx";
import { SelectField, TextField } from "../../ui/controls.tsx";
import { Dialog, DialogActions } from "../../ui/dialog.tsx";
import { parsePercent, percentText } from "../../lib/format/percent.ts";
import { QuantityField, type Understood } from "../../ui/quantity-field.tsx";
import { notify } from "../../ui/toast.tsx";
import { browserIds, useWorkspace, workspaceQueries } from "../workspace/index.ts";

type Draft = Omit<SystemRecord, "kind" | "id">;

const serviceNames: Readonly<Record<Service, string>> = {
  supply: "Supply",
  return: "Return",
  exhaust: "Exhaust",
  "outside-air": "Outside air",
};
const tagLetters: Readonly<Record<Service, string>> = { supply: "S", return: "R", exhaust: "E", "outside-air": "O" };
const classNames: Readonly<Record<DuctClass, string>> = { main: "Main", branch: "Branch", runout: "Runout" };

/** Limits that a new system starts with: common practice, no source; the owner of the job sets their own. */
const USUAL_LIMITS: Draft["limits"] = {
  velocity_m_s: { main: feetPerMinute(1500), branch: feetPerMinute(1200), runout: feetPerMinute(750) },
  frictionRate_pa_m: {
    main: inchesOfWaterPer100Feet(0.1),
    branch: inchesOfWaterPer100Feet(0.1),
    runout: inchesOfWaterPer100Feet(0.1),
  },
  flexibleLength_m: feet(5),
};

const newDraft = (specId: SpecId, taken: ReadonlySet<string>): Draft => ({
  tag: freeTag("supply", taken),
  name: serviceNames.supply,
  service: "supply",
  specId,
  design: {
    altitude_m: meters(0),
    temperature_k: degreesFahrenheit(55),
    relativeHumidity: 0.5,
    availablePressure_pa: inchesOfWater(0.5),
    safetyMargin: 0,
  },
  limits: USUAL_LIMITS,
  sizing: {
    method: "equal-friction",
    frictionRate_pa_m: inchesOfWaterPer100Feet(0.08),
    shape: "rectangular",
    maximumHeight_m: null,
  },
});

const MOST_MARGIN_BP = 5000;

function parseShare(text: string): Understood<number> {
  const basisPoints = parsePercent(text);
  return basisPoints !== null && basisPoints <= MOST_MARGIN_BP
    ? { ok: true, value: basisPoints / 10_000 }
    : { ok: false, problems: [{ message: `“${text.trim()}” is not a percentage from 0 to 50, such as 10.` }] };
}

function formatRatio(share: number) {
  const text = percentText(Math.round(share * 10_000));
  return { text, value: text.replace(" %", ""), unit: "%" };
}

function freeTag(service: Service, taken: ReadonlySet<string>): string {
  for (let number = 1; ; number++)
    if (!taken.has(`${tagLetters[service]}${number}`)) return `${tagLetters[service]}${number}`;
}

/** An air system: what it is for, what the unit gives, its limits, how it is sized and built. */
export function SystemDialog({
  system,
  levelId,
  onClose,
}: {
  system: SystemRecord | null;
  levelId: string;
  onClose: (systemId: string | null) => void;
}) {
  const { systems, units, run, company } = useWorkspace();
  const { data: specs } = useSuspenseQuery(workspaceQueries.specs(company.slug));
  const taken = new Set(systems.map(({ tag }) => tag));
  const [draft, setDraft] = useState<Draft>(() => {
    if (system) {
      const { kind: _kind, id: _id, ...rest } = system;
      return rest;
    }
    return newDraft(specs.items[0]?.id as SpecId, taken);
  });
  const change = (part: Partial<Draft>) => setDraft((before) => ({ ...before, ...part }));
  const tagTaken = draft.tag !== system?.tag && taken.has(draft.tag);

  const save = () => {
    if (draft.tag.trim() === "" || tagTaken) return;
    if (system) {
      run((layout) => setSystem(layout, { id: system.id, fields: draft }));
      return onClose(system.id);
    }
    const id = browserIds.system();
    const answer = run((layout) =>
      addSystem(
        layout,
        {
          system: draft,
          equipment: {
            tag: draft.service === "supply" ? `AH-${draft.tag.replace(/\D/g, "") || "1"}` : `${draft.tag} unit`,
            levelId,
            x_m: meters(0),
            y_m: meters(0),
            elevation_m: meters(3),
          },
        },
        { ...browserIds, system: () => id },
      ),
    );
    if (answer.ok) {
      notify("The equipment stands at the plan's corner: drag it to its place on the board.");
      onClose(id);
    }
  };

  return (
    <Dialog
      open
      wide
      title={system ? `System ${system.tag}` : "New air system"}
      onOpenChange={(open) => !open && onClose(null)}
    >
      <form
        onSubmit={(event) => {
          event.preventDefault();
          save();
        }}
      >
        <div className="grid grid-cols-3 gap-3 max-md:grid-cols-1">
          <SelectField
            label="Service"
            value={draft.service}
            onChange={(event) => {
              const service = event.target.value as Service;
              change(system ? { service } : { service, tag: freeTag(service, taken), name: serviceNames[service] });
            }}
            choices={SERVICES.map((value) => ({ value, label: serviceNames[value] }))}
          />
          <TextField
            label="Tag"
            value={draft.tag}
            maxLength={20}
            error={
              tagTaken ? "Another system has this tag." : draft.tag.trim() === "" ? "A tag such as S1." : undefined
            }
            onChange={(event) => change({ tag: event.target.value })}
          />
          <TextField
            label="Name"
            value={draft.name}
            maxLength={120}
            onChange={(event) => change({ name: event.target.value })}
          />
          <SelectField
            label="Built by"
            value={draft.specId}
            onChange={(event) => change({ specId: event.target.value as SpecId })}
            choices={specs.items.map(({ id, name }) => ({ value: id, label: name }))}
          />
          <QuantityField
            label="Pressure the unit gives"
            value={draft.design.availablePressure_pa}
            parse={(text) => parsePressure(text, units)}
            format={(value) => formatPressure(value, units)}
            onChange={(value) => value !== null && change({ design: { ...draft.design, availablePressure_pa: value } })}
          />
          <QuantityField
            label="Air temperature"
            value={draft.design.temperature_k}
            parse={(text) => parseTemperature(text, units)}
            format={(value) => formatTemperature(value, units)}
            onChange={(value) => value !== null && change({ design: { ...draft.design, temperature_k: value } })}
          />
          <QuantityField
            label="Fan chosen with a margin of"
            hint="On top of the required pressure; shown apart from it."
            value={draft.design.safetyMargin}
            parse={parseShare}
            format={formatRatio}
            onChange={(value) => value !== null && change({ design: { ...draft.design, safetyMargin: value } })}
          />
          <SelectField
            label="Sizes left open are found by"
            value={draft.sizing.method}
            onChange={(event) =>
              change({ sizing: { ...draft.sizing, method: event.target.value as Draft["sizing"]["method"] } })
            }
            choices={[
              { value: "equal-friction", label: "Equal friction" },
              { value: "velocity", label: "Velocity limit" },
            ]}
          />
          <SelectField
            label="as"
            value={draft.sizing.shape}
            onChange={(event) =>
              change({ sizing: { ...draft.sizing, shape: event.target.value as Draft["sizing"]["shape"] } })
            }
            choices={[
              { value: "rectangular", label: "Rectangular" },
              { value: "round", label: "Round" },
              { value: "flat-oval", label: "Flat oval" },
            ]}
          />
          <QuantityField
            label="at a friction of"
            value={draft.sizing.frictionRate_pa_m}
            parse={(text) => parseFrictionRate(text, units)}
            format={(value) => formatFrictionRate(value, units)}
            onChange={(value) => value !== null && change({ sizing: { ...draft.sizing, frictionRate_pa_m: value } })}
          />
          <QuantityField
            label="no higher than"
            hint="Empty where there is room."
            value={draft.sizing.maximumHeight_m}
            parse={(text) => parseLength(text, units)}
            format={(value) => formatLength(value, units)}
            onChange={(value) => change({ sizing: { ...draft.sizing, maximumHeight_m: value } })}
          />
          <QuantityField
            label="Flexible duct up to"
            value={draft.limits.flexibleLength_m}
            parse={(text) => parseLength(text, units)}
            format={(value) => formatLength(value, units)}
            onChange={(value) => value !== null && change({ limits: { ...draft.limits, flexibleLength_m: value } })}
          />
        </div>
        <h3 className="mt-4 text-head">Limits by class</h3>
        <p className="text-help text-ink-3">The usual figures stand here to be replaced: common practice, no source.</p>
        <div className="mt-2 grid grid-cols-3 gap-3 max-md:grid-cols-1">
          {DUCT_CLASSES.map((each) => (
            <QuantityField
              key={each}
              label={`${classNames[each]}, velocity`}
              value={draft.limits.velocity_m_s[each]}
              parse={(text) => parseVelocity(text, units)}
              format={(value) => formatVelocity(value, units)}
              onChange={(value) =>
                value !== null &&
                change({ limits: { ...draft.limits, velocity_m_s: { ...draft.limits.velocity_m_s, [each]: value } } })
              }
            />
          ))}
          {DUCT_CLASSES.map((each) => (
            <QuantityField
              key={each}
              label={`${classNames[each]}, friction`}
              value={draft.limits.frictionRate_pa_m[each]}
              parse={(text) => parseFrictionRate(text, units)}
              format={(value) => formatFrictionRate(value, units)}
              onChange={(value) =>
                value !== null &&
                change({
                  limits: { ...draft.limits, frictionRate_pa_m: { ...draft.limits.frictionRate_pa_m, [each]: value } },
                })
              }
            />
          ))}
        </div>
        <DialogActions>
          <Button onClick={() => onClose(null)}>Leave it</Button>
          <Button rank="primary" type="submit">
            {system ? "Save system" : "Add system"}
          </Button>
        </DialogActions>
      </form>
    </Dialog>
  );
}
