import {
  formatLength,
  formatPressure,
  formatThickness,
  parseLength,
  parseThickness,
} from "@cleatwork/calc/display/index";
import { SPLITTER_COUNTS, inches, meters, type Meters, type Pascals, sheetLabels } from "@cleatwork/calc";
import { endpoints, specRequest, type Spec } from "@cleatwork/contracts";
import { useQueryClient } from "@tanstack/react-query";
import type { ReactNode } from "react";
import { useFormContext, useWatch } from "react-hook-form";
import type { z } from "zod";
import { api } from "../../lib/http.ts";
import { Button } from "../../ui/button.tsx";
import { CheckField, SelectField } from "../../ui/controls.tsx";
import { ContractFormView } from "../../ui/form/contract-form-view.tsx";
import { formParts } from "../../ui/form/form-parts.tsx";
import { useContractForm } from "../../ui/form/use-contract-form.ts";
import { notify } from "../../ui/toast.tsx";
import { useSession } from "../session/index.ts";
import { startingConstruction } from "./new-spec.ts";
import { degrees, parsePressureClass, percent, plainNumber } from "./spec-numbers.ts";
import { specChoices } from "./spec-words.ts";
import { specQueries } from "./specs.queries.ts";

type Values = z.input<typeof specRequest>;
const { Text, Select, Quantity } = formParts<Values>();

/** How duct is built: what solving, taking off and pricing all read. */
export function SpecForm({ spec, onSaved }: { spec: Spec | null; onSaved: (spec: Spec) => void }) {
  const { slug, may } = useSession();
  const cache = useQueryClient();
  const mayWrite = may("specs.write");
  const contractForm = useContractForm({
    schema: specRequest,
    initial: spec
      ? { name: spec.name, construction: spec.construction }
      : { name: "", construction: startingConstruction },
    version: spec?.version ?? 0,
    save: (body, { version, idempotencyKey }) =>
      spec
        ? api(endpoints.updateSpec, { params: { company: slug, specId: spec.id }, body, version })
        : api(endpoints.createSpec, { params: { company: slug }, body, idempotencyKey }),
    onSaved: async (saved) => {
      notify(`${saved.name} is saved. Layouts that use it are computed anew when opened.`, { severity: "good" });
      await cache.invalidateQueries(specQueries.list(slug));
      onSaved(saved);
    },
    ...(spec
      ? {
          reload: async () => {
            const { items } = await cache.fetchQuery({ ...specQueries.list(slug), staleTime: 0 });
            const now = items.find((one) => one.id === spec.id) ?? spec;
            return { values: { name: now.name, construction: now.construction }, version: now.version };
          },
        }
      : {}),
  });
  return (
    <ContractFormView
      contractForm={contractForm}
      guard
      label={spec ? spec.name : "New spec"}
      className="gap-5!"
      actions={
        mayWrite && (
          <div className="border-t border-line pt-4">
            <Button type="submit" rank="primary" busy={contractForm.busy}>
              {spec ? "Save" : "Add the spec"}
            </Button>
          </div>
        )
      }
    >
      <fieldset disabled={!mayWrite} className="grid gap-5">
        <legend className="sr-only">Construction</legend>
        <Text name="name" label="Name" autoComplete="off" className="max-w-md" />
        <Sheet />
        <Rectangular />
        <Round />
        <Fittings />
        <Covering />
      </fieldset>
    </ContractFormView>
  );
}

const useUnits = () => useSession().company.unitSystem;

function Part({ title, children }: { title: string; children: ReactNode }) {
  return (
    <fieldset className="border-t border-line pt-3">
      <legend className="float-left mb-3 w-full text-head font-[640]">{title}</legend>
      <div className="clear-both grid items-start gap-3 sm:grid-cols-2 lg:grid-cols-3">{children}</div>
    </fieldset>
  );
}

function Length({
  name,
  label,
  hint,
}: {
  name:
    | `construction.sectionLength_m.${"rectangular" | "round" | "flatOval"}`
    | `construction.hangerSpacing_m.${"rectangular" | "round"}`;
  label: string;
  hint?: string;
}) {
  const units = useUnits();
  return (
    <Quantity<Meters>
      name={name}
      label={label}
      hint={hint}
      parse={(text) => parseLength(text, units)}
      format={(value) => formatLength(value, units)}
    />
  );
}

function Sheet() {
  const units = useUnits();
  return (
    <Part title="Sheet and class">
      <Select name="construction.material" label="Material" choices={specChoices.material} />
      <Quantity<Pascals>
        name="construction.pressureClass_pa"
        label="Pressure class"
        parse={(text) => parsePressureClass(text, units)}
        format={(value) => formatPressure(value, units)}
        hint="Positive for supply, negative where duct is under suction. It decides gauge and reinforcement."
      />
      <Select
        name="construction.sealClass"
        label="Seal class"
        choices={specChoices.sealClass}
        hint="It decides leakage and sealant."
      />
      <SheetOfTheJob />
    </Part>
  );
}

/** What the job asks for goes before every schedule; a duct's own sheet goes before this. */
function SheetOfTheJob() {
  const { setValue } = useFormContext<Values>();
  const { gauge, material } = useWatch<Values, "construction">({ name: "construction" });
  return (
    <SelectField
      label="Sheet for everything"
      empty="By size, from the schedule"
      value={gauge ?? ""}
      onChange={(event) =>
        setValue("construction.gauge", event.target.value === "" ? null : event.target.value, { shouldDirty: true })
      }
      choices={sheetLabels(material).map((value) => ({ value, label: value }))}
      hint="Only where the job names one sheet. Lighter than the schedule is pointed out."
    />
  );
}

function FromSchedule() {
  const { setValue } = useFormContext<Values>();
  const fromSchedule = useWatch<Values, "construction.constructionFromSchedule">({
    name: "construction.constructionFromSchedule",
  });
  return (
    <CheckField
      className="sm:col-span-2 lg:col-span-3"
      label="Joint, seam and length of a piece as the gauge schedule names them"
      hint="Where it names none, these count."
      checked={fromSchedule ?? false}
      onChange={(event) =>
        setValue("construction.constructionFromSchedule", event.target.checked, { shouldDirty: true })
      }
    />
  );
}

function Rectangular() {
  return (
    <Part title="Rectangular">
      <FromSchedule />
      <Select
        name="construction.rectangularJoint"
        label="Joint"
        choices={specChoices.rectangularJoint}
        hint="Transverse, end to end."
      />
      <Select
        name="construction.rectangularSeam"
        label="Seam"
        choices={specChoices.rectangularSeam}
        hint="Longitudinal, along the flow."
      />
      <Length name="construction.sectionLength_m.rectangular" label="Length of a piece" />
      <Length
        name="construction.hangerSpacing_m.rectangular"
        label="Hanger spacing"
        hint="Usually 8 or 10 ft: SMACNA, HVAC Duct Construction Standards, 1995, S4.2."
      />
    </Part>
  );
}

function Round() {
  return (
    <Part title="Round and flat oval">
      <Select name="construction.roundConstruction" label="Construction" choices={specChoices.roundConstruction} />
      <Select name="construction.roundJoint" label="Joint" choices={specChoices.roundJoint} />
      <Length name="construction.sectionLength_m.round" label="Length of a round piece" />
      <Length name="construction.sectionLength_m.flatOval" label="Length of a flat oval piece" />
      <Length
        name="construction.hangerSpacing_m.round"
        label="Hanger spacing"
        hint="At most 12 ft: SMACNA, HVAC Duct Construction Standards, 1995, table 4-2."
      />
    </Part>
  );
}

function Fittings() {
  const elbow = useWatch<Values, "construction.elbow">({ name: "construction.elbow" });
  return (
    <Part title="Fittings, where the layout does not say otherwise">
      <Select name="construction.elbow.rectangular" label="Rectangular elbow" choices={specChoices.elbowRectangular} />
      {elbow.rectangular === "radius-splitters" && <Splitters />}
      <Select name="construction.elbow.round" label="Round elbow" choices={specChoices.elbowRound} />
      <Quantity<number>
        name="construction.elbow.radiusRatio"
        label="Elbow radius"
        hint="Center-line radius over width or diameter. 1.5 is common practice."
        {...plainNumber("× width", "1.5")}
      />
      <Select
        name="construction.branch.rectangular"
        label="Rectangular branch"
        choices={specChoices.branchRectangular}
      />
      <Select name="construction.branch.round" label="Round branch" choices={specChoices.branchRound} />
      <Quantity<number>
        name="construction.transitionAngle_rad"
        label="Transition angle"
        hint="The whole angle. 30° is common practice."
        {...degrees}
      />
      <Quantity<number>
        name="construction.flexibleSlack"
        label="Slack of flexible duct"
        hint="0 is pulled tight. Slack costs pressure quickly."
        {...percent}
      />
    </Part>
  );
}

/** A number in the spec, a choice on the screen. */
function Splitters() {
  const { setValue } = useFormContext<Values>();
  const count = useWatch<Values, "construction.elbow.splitterCount">({ name: "construction.elbow.splitterCount" });
  return (
    <SelectField
      label="Splitters in an elbow"
      value={String(count ?? 1)}
      onChange={(event) => {
        const chosen = SPLITTER_COUNTS.find((accepted) => String(accepted) === event.target.value);
        setValue("construction.elbow.splitterCount", chosen, { shouldDirty: true });
      }}
      choices={specChoices.splitterCount}
      hint="They stand closer toward the throat, so that every passage bends alike."
    />
  );
}

function Covering() {
  const units = useUnits();
  const { setValue } = useFormContext<Values>();
  const insulation = useWatch<Values, "construction.insulation">({ name: "construction.insulation" });
  const choose = (kind: string) => {
    if (kind === "none") return setValue("construction.insulation", { kind: "none" }, { shouldDirty: true });
    const thickness_m =
      insulation.kind === "none" ? (units === "si" ? meters(0.025) : inches(1)) : insulation.thickness_m;
    setValue(
      "construction.insulation",
      { kind: kind === "liner" ? "liner" : "wrap", thickness_m },
      { shouldDirty: true },
    );
  };
  return (
    <Part title="Insulation">
      <SelectField
        label="Insulation"
        value={insulation.kind}
        onChange={(event) => choose(event.target.value)}
        choices={specChoices.insulation}
        hint="A segment can say otherwise. What the energy code asks for is yours to check."
      />
      {insulation.kind !== "none" && (
        <Quantity<Meters>
          name="construction.insulation.thickness_m"
          label="Thickness"
          parse={(text) => parseThickness(text, units)}
          format={(value) => formatThickness(value, units)}
        />
      )}
      <Select
        name="construction.sizesAre"
        label="Drawing sizes are"
        choices={specChoices.sizesAre}
        hint="They differ only where there is liner."
      />
    </Part>
  );
}
