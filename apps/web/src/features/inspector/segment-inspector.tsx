import {
  ACCESSORY_KINDS,
  DUCT_CLASSES,
  formatLength,
  formatSize,
  meters,
  parseLength,
  parseSize,
  type AccessoryKind,
  type DuctClass,
} from "@cleatwork/calc";
import type { SegmentRecord } from "@cleatwork/contracts";
import { find, lengthOfSegment, setLength, setSegments } from "@cleatwork/layout";
import { CheckField, SelectField } from "../../ui/controls.tsx";
import { useWorkspace } from "../workspace/index.ts";
import { DamperField, FittingField, MouthField } from "./fitting-fields.tsx";
import { SegmentResults } from "./segment-results.tsx";
import { anyText, TypedField } from "./typed-field.tsx";
import { accessoryNames, classNames as ductClassNames } from "./words.ts";

/** One duct, or many at once: a field that is set is set on all of them, as one step of undo. */
export function SegmentInspector({ segments }: { segments: readonly SegmentRecord[] }) {
  const { layout, units, run, mayEdit, solvedOf, numberOf } = useWorkspace();
  const [first] = segments;
  if (!first) return null;
  const ids = segments.map(({ id }) => id);
  const set = (label: string, fields: Parameters<typeof setSegments>[1]["fields"]) =>
    run((now) => setSegments(now, { ids, fields, label }));
  const same = <T,>(of: (segment: SegmentRecord) => T) => segments.every((segment) => of(segment) === of(first));
  const sizeText = (segment: SegmentRecord) => (segment.section ? formatSize(segment.section, units).text : "");
  const lengthText = (segment: SegmentRecord) => formatLength(meters(lengthOfSegment(layout, segment)), units).text;
  const sized = solvedOf(first.id)?.section;

  return (
    <div className="grid gap-3 p-4">
      <header>
        <p className="label-width text-label text-ink-3">
          {segments.length === 1
            ? `Segment ${numberOf(first.id)}, ${ductClassNames[first.ductClass]}`
            : `${segments.length} segments`}
        </p>
        <h2 className="text-title font-[640]">
          {segments.length === 1 ? first.name || "Unnamed duct" : "Several ducts"}
        </h2>
      </header>
      <fieldset disabled={!mayEdit} className="grid gap-3">
        <TypedField
          label="Size"
          text={sizeText(first)}
          mixed={!same(sizeText)}
          placeholder={sized ? `sized ${formatSize(sized, units).text}` : "left to sizing"}
          hint={
            first.section ? "Typed. Empty leaves it to sizing." : "Left to sizing. Type 24x12, 14ø, 20x10fo or 12/8."
          }
          parse={(typed) =>
            parseSize(typed, units, first.section?.shape === "round" || first.flexible ? "round" : "refuse")
          }
          onCommit={(section) => set(`Size ${formatSize(section, units).text}`, { section })}
          onClear={() => set("Leave size to sizing", { section: null })}
        />
        <TypedField
          label="Length"
          text={lengthText(first)}
          mixed={!same(lengthText)}
          parse={(typed) => parseLength(typed, units)}
          onCommit={(length_m) => {
            for (const segmentId of ids) run((now) => setLength(now, { segmentId, length_m }));
          }}
        />
        <TypedField
          label="Name"
          text={first.name}
          mixed={!same(({ name }) => name)}
          parse={anyText}
          onCommit={(name) => set("Name", { name })}
          onClear={() => set("Name", { name: "" })}
        />
        <SelectField
          label="Class"
          value={first.ductClass}
          onChange={(event) => set("Class", { ductClass: event.target.value as DuctClass })}

          choices={DUCT_CLASSES.map((value) => ({ value, label: ductClassNames[value] }))}
        />
        <FittingField first={first} set={set} />
        {segments.every(({ toNodeId }) => find(layout, "node", toNodeId)?.role === "outlet") && (
          <MouthField first={first} set={set} />
        )}
        <CheckField
          label="Flexible"
          checked={first.flexible}
          onChange={(event) => set(event.target.checked ? "Flexible" : "Rigid", { flexible: event.target.checked })}
        />
        <fieldset>
          <legend className="label-width text-help font-medium text-ink-2">Accessories</legend>
          {ACCESSORY_KINDS.map((kind) => (
            <CheckField
              key={kind}
              label={accessoryNames[kind]}
              checked={first.accessories.includes(kind)}
              onChange={(event) =>
                set(accessoryNames[kind], { accessories: toggled(first.accessories, kind, event.target.checked) })
              }
            />
          ))}
        </fieldset>
        {segments.every(({ accessories }) => accessories.includes("volume-damper")) && (
          <DamperField segments={segments} set={set} />
        )}
      </fieldset>
      {segments.length === 1 && <SegmentResults segment={first} />}
    </div>
  );
}

const toggled = (list: readonly AccessoryKind[], kind: AccessoryKind, on: boolean): AccessoryKind[] =>
  on ? [...list, kind] : list.filter((each) => each !== kind);
