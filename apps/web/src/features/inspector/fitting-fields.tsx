import { type FittingType, type MouthType } from "@cleatwork/calc";
import type { SegmentRecord } from "@cleatwork/contracts";
import type { setSegments } from "@cleatwork/layout";
import { SelectField } from "../../ui/controls.tsx";
import { parseDegrees } from "./degrees.ts";
import { TypedField } from "./typed-field.tsx";
import { fittingGroups, fittingNames, mouthNames } from "./words.ts";

type Set = (label: string, fields: Parameters<typeof setSegments>[1]["fields"]) => void;

/** The fitting at the end nearer the equipment. */
export function FittingField({ first, set }: { first: SegmentRecord; set: Set }) {
  return (
    <SelectField
      label="Fitting at its start"
      value={first.fitting ?? ""}
      hint={first.fitting ? "Chosen." : "Inferred from the drawing."}
      onChange={(event) => set("Fitting", { fitting: (event.target.value || null) as FittingType | null })}
      empty="Inferred"
    >
      {fittingGroups.map(({ label, types }) => (
        <optgroup key={label} label={label}>
          {types.map((type) => (
            <option key={type} value={type}>
              {fittingNames[type]}
            </option>
          ))}
        </optgroup>
      ))}
    </SelectField>
  );
}

/** How the duct ends at its outlet. */
export function MouthField({ first, set }: { first: SegmentRecord; set: Set }) {
  return (
    <SelectField
      label="End at its outlet"
      value={first.mouth ?? ""}
      hint="Its loss is added to what the outlet needs."
      onChange={(event) => set("End at the outlet", { mouth: (event.target.value || null) as MouthType | null })}
      empty="As the outlet says"
      choices={Object.entries(mouthNames).map(([value, label]) => ({ value, label }))}
    />
  );
}

/** The blade of the volume damper, in degrees from open. */
export function DamperField({ segments, set }: { segments: readonly SegmentRecord[]; set: Set }) {
  const textOf = ({ damperAngle_rad }: SegmentRecord) =>
    damperAngle_rad ? `${Number(((damperAngle_rad * 180) / Math.PI).toFixed(1))}°` : "";
  const text = textOf(segments[0]!);
  return (
    <TypedField
      label="Damper blade"
      text={text}
      mixed={segments.some((segment) => textOf(segment) !== text)}
      placeholder="open"
      hint="Degrees from open; 0 is open, up to 70 is computed."
      parse={parseDegrees}
      onCommit={(damperAngle_rad) => set("Damper blade", { damperAngle_rad })}
      onClear={() => set("Damper blade", { damperAngle_rad: null })}
    />
  );
}
