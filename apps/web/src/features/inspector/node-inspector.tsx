import {
  formatAirflow,
  formatElevation,
  formatPressure,
  parseAirflow,
  parseLength,
  parsePressure,
  cubicMetersPerSecond,
  type NodeRole,
} from "@cleatwork/calc";
import type { NodeRecord } from "@cleatwork/contracts";
import { setNodes } from "@cleatwork/layout";
import { SelectField } from "../../ui/controls.tsx";
import { useWorkspace } from "../workspace/index.ts";
import { anyText, TypedField } from "./typed-field.tsx";

const roleNames: Readonly<Record<NodeRole, string>> = { equipment: "Equipment", junction: "Joint", outlet: "Outlet" };

/** Equipment, a joint or an outlet; many outlets at once take one airflow, one device. */
export function NodeInspector({ nodes }: { nodes: readonly NodeRecord[] }) {
  const { units, run, mayEdit, index } = useWorkspace();
  const [first] = nodes;
  if (!first) return null;
  const ids = nodes.map(({ id }) => id);
  const set = (label: string, fields: Parameters<typeof setNodes>[1]["fields"]) =>
    run((now) => setNodes(now, { ids, fields, label }));
  const same = <T,>(of: (node: NodeRecord) => T) => nodes.every((node) => of(node) === of(first));
  const isOutlet = nodes.every(({ role }) => role === "outlet");
  const mayBeOutlet = nodes.every(
    ({ id, role }) => role !== "equipment" && (index.childrenOf.get(id) ?? []).length === 0,
  );

  return (
    <div className="grid gap-3 p-4">
      <header>
        <p className="label-width text-label text-ink-3">
          {nodes.length === 1 ? roleNames[first.role] : `${nodes.length} nodes`}
        </p>
        <h2 className="text-title font-[640]">
          {nodes.length === 1 ? first.tag || first.spaceName || roleNames[first.role] : "Several nodes"}
        </h2>
      </header>
      <fieldset disabled={!mayEdit} className="grid gap-3">
        <TypedField
          label="Tag"
          text={first.tag}
          mixed={!same(({ tag }) => tag)}
          parse={anyText}
          onCommit={(tag) => set("Tag", { tag })}
          onClear={() => set("Tag", { tag: "" })}
        />
        {mayBeOutlet && (
          <SelectField
            label="It is"
            value={first.role}
            onChange={(event) => set("Change node", roleFields(event.target.value as NodeRole))}

            choices={[
              { value: "junction", label: "the end of a duct" },
              { value: "outlet", label: "an outlet" },
            ]}
          />
        )}
        {isOutlet && (
          <>
            <TypedField
              label="Airflow"
              text={first.airflow_m3s === null ? "" : formatAirflow(first.airflow_m3s, units).text}
              mixed={!same(({ airflow_m3s }) => airflow_m3s)}
              parse={(typed) => parseAirflow(typed, units)}
              onCommit={(airflow_m3s) =>
                set(`Airflow ${formatAirflow(cubicMetersPerSecond(airflow_m3s), units).text}`, { airflow_m3s })
              }
            />
            <TypedField
              label="Needs at its connection"
              text={first.requiredPressure_pa === null ? "" : formatPressure(first.requiredPressure_pa, units).text}
              mixed={!same(({ requiredPressure_pa }) => requiredPressure_pa)}
              hint="Total pressure, from the device's catalog."
              parse={(typed) => parsePressure(typed, units)}
              onCommit={(requiredPressure_pa) => set("Outlet pressure", { requiredPressure_pa })}
            />
            <TypedField
              label="Device, as in the price book"
              text={first.deviceKey ?? ""}
              mixed={!same(({ deviceKey }) => deviceKey)}
              parse={anyText}
              onCommit={(deviceKey) => set("Device", { deviceKey })}
              onClear={() => set("Device", { deviceKey: null })}
            />
            <TypedField
              label="Space"
              text={first.spaceName}
              mixed={!same(({ spaceName }) => spaceName)}
              parse={anyText}
              onCommit={(spaceName) => set("Space", { spaceName })}
              onClear={() => set("Space", { spaceName: "" })}
            />
          </>
        )}
        <TypedField
          label="Center line above the floor"
          text={formatElevation(first.elevation_m, units).text}
          mixed={!same(({ elevation_m }) => elevation_m)}
          parse={(typed) => parseLength(typed, units)}
          onCommit={(elevation_m) => set("Height", { elevation_m })}
        />
      </fieldset>
    </div>
  );
}

const roleFields = (role: NodeRole) =>
  role === "outlet" ? { role } : { role, airflow_m3s: null, requiredPressure_pa: null, deviceKey: null, spaceName: "" };
